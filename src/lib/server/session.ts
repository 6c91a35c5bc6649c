import type { RequestEvent } from '@sveltejs/kit';
import type { RoomRole } from '../schemas/rooms';
import { reader } from './db/client';
import { Forbidden, NoRoom, NotFound, Unauthenticated } from './errors';
import { findMembership } from './queries/rooms';

/** Who is acting, and in which room: the first thing that every query and service of a room is told. */
export interface Actor {
	readonly userId: string;
	readonly roomId: string;
	readonly role: RoomRole;
	/** Where false, what things cost is left out of every answer. */
	readonly seesPrices: boolean;
}

type Signed = Pick<RequestEvent, 'locals'>;

const RANK: Record<RoomRole, number> = { viewer: 0, member: 1, owner: 2 };

/** @throws {Unauthenticated} */
export function requireUser(event: Signed): NonNullable<App.Locals['user']> {
	if (!event.locals.user) throw new Unauthenticated();
	return event.locals.user;
}

/**
 * The signed-in person in a room: the one named, else the one this browser is working in.
 * @throws {Unauthenticated | NoRoom | NotFound | Forbidden} NotFound where she isn't of that room.
 */
export async function requireActor(event: Signed, atLeast: RoomRole, roomId?: string): Promise<Actor> {
	const user = requireUser(event);
	const wanted = roomId ?? event.locals.session?.roomId;
	if (!wanted) throw new NoRoom();
	const membership = await findMembership(reader, user.id, wanted);
	if (!membership) throw roomId ? new NotFound() : new NoRoom();
	if (RANK[membership.role] < RANK[atLeast]) throw new Forbidden();
	return {
		userId: user.id,
		roomId: wanted,
		role: membership.role,
		seesPrices: membership.role !== 'viewer' || membership.pricesShown
	};
}
