import type { RoomRole } from '$lib/schemas/rooms';

/** What each role may do, to follow “who”. */
export const ROLE_MEANS: Readonly<Record<RoomRole, string>> = {
	owner: 'runs the room: its people, settings and everything in it',
	member: 'adds, plans and cuts',
	viewer: 'sees the stash and the projects, and changes nothing'
};

export const ROLE_OPTIONS = [
	{ value: 'owner', label: 'Owner' },
	{ value: 'member', label: 'Member' },
	{ value: 'viewer', label: 'Viewer' }
] as const;
