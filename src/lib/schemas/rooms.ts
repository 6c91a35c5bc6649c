/** What somebody may do in a room: owners run it, members add, cut and plan, viewers see. */
export const ROOM_ROLES = ['owner', 'member', 'viewer'] as const;
export type RoomRole = (typeof ROOM_ROLES)[number];

export const ROOM_UNITS = ['in', 'mm', 'cm'] as const;
export type RoomUnits = (typeof ROOM_UNITS)[number];
