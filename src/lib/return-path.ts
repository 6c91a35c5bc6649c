const HERE = 'https://here.invalid';
export const HOME = '/today';

/** The part of a return address that stays on this site; anything that would leave it becomes `fallback`. */
export function returnPath(asked: string | null | undefined, fallback = HOME): string {
	if (!asked?.startsWith('/')) return fallback;
	try {
		const url = new URL(asked, HERE);
		const path = url.pathname + url.search;
		return url.origin === HERE && !/^\/[/\\]/.test(path) ? path : fallback;
	} catch {
		return fallback;
	}
}
