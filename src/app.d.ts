import type { SiteRole } from '$lib/server/db/schema/people';

declare global {
	namespace App {
		interface Error {
			message: string;
			/** Names the request in the server's log. */
			id?: string;
		}
		interface Locals {
			/** Names the request in the log. */
			requestId: string;
			user: { id: string; email: string; name: string; siteRole: SiteRole } | null;
			session: { id: string; roomId: string | null } | null;
		}
	}
}
