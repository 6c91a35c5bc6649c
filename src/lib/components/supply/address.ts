/** The page's own address with some of its parameters changed; null takes one out. Other filters start at page 1. */
export function addressWith(
	url: URL,
	changes: Readonly<Record<string, string | null>>,
	path = url.pathname
): string {
	const params = new URLSearchParams(
		[...url.searchParams].filter(
			([name, value]) => value !== '' && name !== 'did' && name !== 'page' && !name.startsWith('/')
		)
	);
	for (const [name, value] of Object.entries(changes)) {
		if (value === null || value === '') params.delete(name);
		else params.set(name, value);
	}
	const query = params.toString();
	return query === '' ? path : `${path}?${query}`;
}
