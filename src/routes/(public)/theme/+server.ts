import { chooseTheme, THEMES } from '$lib/server/theme';
import { error, redirect, type RequestHandler } from '@sveltejs/kit';

/** Keeps the theme that this browser wears; a visitor may choose too. */
export const POST: RequestHandler = async ({ request, cookies, locals }) => {
	const chosen = (await request.formData()).get('theme');
	const theme = THEMES.find((known) => known === chosen);
	if (!theme) error(400, 'There is no such theme.');
	chooseTheme(cookies, theme);
	if (!request.headers.get('accept')?.includes('text/html')) return new Response(null, { status: 204 });
	redirect(303, locals.user ? '/account' : '/');
};
