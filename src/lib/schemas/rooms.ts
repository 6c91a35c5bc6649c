import { z } from 'zod';
import { parseLength } from '../domain/length';
import { isCurrency } from '../domain/money';

/** What somebody may do in a room: owners run it, members add, cut and plan, viewers see. */
export const ROOM_ROLES = ['owner', 'member', 'viewer'] as const;
export type RoomRole = (typeof ROOM_ROLES)[number];

export const ROOM_UNITS = ['in', 'mm', 'cm'] as const;
export type RoomUnits = (typeof ROOM_UNITS)[number];

export const roomName = z
	.string()
	.trim()
	.min(1, 'Give the room a name.')
	.max(80, 'Up to 80 letters, please.');

/** A room's settings as they are kept; lengths in 1/320 mm. */
export interface RoomSettings {
	readonly name: string;
	readonly units: RoomUnits;
	readonly reach: number | null;
	readonly keepOffcut: number | null;
	readonly currency: string;
	readonly pricesShown: boolean;
}

/** As they are typed: a length may be blank, and is in the room's units unless it names its own. */
export const roomSettingsSchema = z
	.object({
		name: roomName,
		units: z.enum(ROOM_UNITS),
		reach: z.string().max(40).default(''),
		keepOffcut: z.string().max(40).default(''),
		currency: z
			.string()
			.trim()
			.toUpperCase()
			.refine(isCurrency, 'Three letters, as on a bank’s list: USD, EUR, GBP.'),
		pricesShown: z.boolean().default(false)
	})
	.superRefine((typed, check) => {
		for (const field of ['reach', 'keepOffcut'] as const) {
			const refusal = readLength(typed[field], typed.units);
			if (typeof refusal === 'string') {
				check.addIssue({ code: 'custom', path: [field], message: refusal });
			}
		}
	});

/** Takes the typed settings, already found good, to how they are kept. */
export function readRoomSettings(typed: z.output<typeof roomSettingsSchema>): RoomSettings {
	return {
		...typed,
		reach: readLength(typed.reach, typed.units) as number | null,
		keepOffcut: readLength(typed.keepOffcut, typed.units) as number | null
	};
}

export const newRoomSchema = z.object({ id: z.uuid(), name: roomName });
export const chooseRoomSchema = z.object({ room: z.uuid() });
export const inviteSchema = z.object({ role: z.enum(ROOM_ROLES).default('member') });
export const withdrawSchema = z.object({ invitation: z.uuid() });
export const roleSchema = z.object({ person: z.uuid(), role: z.enum(ROOM_ROLES) });
export const removeSchema = z.object({ person: z.uuid() });

/** The length, null for a blank, or why it can't be read. */
function readLength(text: string, unit: RoomUnits): number | null | string {
	if (text.trim() === '') return null;
	const read = parseLength(text, { unit });
	return read.ok ? read.value : read.reason;
}
