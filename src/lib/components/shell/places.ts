/** The four places of a room, in the order in which the evening goes. */
export const PLACES = [
	{ href: '/today', label: 'Today', mark: 'flaps' },
	{ href: '/supplies', label: 'Stash', mark: 'sheets' },
	{ href: '/projects', label: 'Projects', mark: 'bill' },
	{ href: '/room', label: 'Room', mark: 'room' }
] as const;

export type PlaceMark = (typeof PLACES)[number]['mark'];

export const isAt = (pathname: string, href: string) => pathname === href || pathname.startsWith(`${href}/`);
