/** A key for exchange documents, made from a name: letters, digits and hyphens, at most 48 of them. */
export function keyFrom(name: string, otherwise: string): string {
	const plain = name
		.normalize('NFKD')
		.replace(/\p{M}/gu, '')
		.toLowerCase()
		.replace(/[^a-z0-9]+/g, '-')
		.replace(/^-+|-+$/g, '')
		.slice(0, 48)
		.replace(/-+$/, '');
	return plain === '' ? otherwise : plain;
}
