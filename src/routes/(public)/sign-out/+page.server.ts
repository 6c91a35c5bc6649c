import { redirect } from '@sveltejs/kit';
import { signOut } from '../../../auth';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = ({ locals }) => ({ name: locals.user?.name ?? null });

export const actions: Actions = {
	default: async (event) => {
		await signOut(event);
		redirect(303, '/');
	}
};
