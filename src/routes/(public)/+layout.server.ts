import { readTheme } from '$lib/server/theme';
import type { LayoutServerLoad } from './$types';

export const load: LayoutServerLoad = ({ locals, cookies }) => ({
	signedIn: locals.user !== null,
	theme: readTheme(cookies)
});
