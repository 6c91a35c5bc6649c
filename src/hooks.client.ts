import type { HandleClientError } from '@sveltejs/kit';

export const handleError: HandleClientError = ({ status }) => ({
	message:
		status === 404
			? 'There is nothing at this address.'
			: 'This page didn’t come through. Check the connection, then load it again.'
});
