import type { Cookies } from '@sveltejs/kit';

export const THEMES = ['system', 'light', 'dark'] as const;
export type Theme = (typeof THEMES)[number];

const COOKIE = 'paperlarder-theme';
const YEAR = 60 * 60 * 24 * 365;

/** The theme this browser chose; `system` where it chose none. */
export function readTheme(cookies: Pick<Cookies, 'get'>): Theme {
	const chosen = cookies.get(COOKIE);
	return THEMES.find((theme) => theme === chosen) ?? 'system';
}

export function chooseTheme(cookies: Cookies, theme: Theme) {
	cookies.set(COOKIE, theme, { path: '/', maxAge: YEAR, sameSite: 'lax', httpOnly: true });
}

/** For `resolve`'s `transformPageChunk`: the first paint already wears the theme, so nothing flashes. */
export const paintTheme =
	(theme: Theme) =>
	({ html }: { html: string }) =>
		html.replace('%paperlarder.theme%', theme);
