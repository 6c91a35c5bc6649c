import { json, type RequestEvent } from '@sveltejs/kit';
import type { z } from 'zod';
import { shaped } from '../../domain/exchange/shape';
import { api } from '../answer';
import { readable } from '../readable';
import { requireActor, type Actor } from '../session';
import { readJson } from './body';
import { operations, type Operation, type Operations } from './operations';

const KILOBYTE = 1024;

type BodyOf<One> = One extends { readElsewhere: true }
	? unknown
	: One extends { body: infer Schema extends z.ZodType }
		? z.output<Schema>
		: undefined;
type QueryOf<One> = One extends { query: infer Schema extends z.ZodObject } ? z.output<Schema> : undefined;
type ActorOf<One> = One extends { access: 'open' } ? null : Actor;

interface Asked<One> {
	readonly event: RequestEvent;
	readonly actor: ActorOf<One>;
	readonly body: BodyOf<One>;
	readonly query: QueryOf<One>;
	/** The path's `[id]`. */
	readonly id: string;
}

/** The handler of one operation: asks who it is, reads what was sent by the operation's schemas, answers JSON. */
export function operate<Name extends keyof Operations>(
	name: Name,
	work: (asked: Asked<Operations[Name]>) => Promise<unknown>
) {
	const operation: Operation = operations[name];
	return api(async (event: RequestEvent) => {
		const { room, id = '' } = event.params;
		const actor = operation.access === 'open' ? null : await requireActor(event, operation.access, room);
		const asked = {
			...{ event, actor, id },
			body: await bodyOf(operation, event.request),
			query: operation.query?.parse(Object.fromEntries(event.url.searchParams))
		};
		const answer = await work(asked as unknown as Asked<Operations[Name]>);
		if (operation.status === 204) return new Response(null, { status: 204 });
		return json(answer, { status: operation.status ?? 200 });
	});
}

async function bodyOf({ body, limit = 256 * KILOBYTE, readElsewhere }: Operation, request: Request) {
	if (!body) return undefined;
	const sent = await readJson(request, limit);
	return readElsewhere ? sent : readable(() => shaped(body, sent));
}
