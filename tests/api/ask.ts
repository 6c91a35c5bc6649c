import type { RequestEvent } from '@sveltejs/kit';
import { connect, type Database } from '../../src/lib/server/db/client';
import { readEnv, settle } from '../../src/lib/server/env';
import type { Actor } from '../../src/lib/server/session';
import { emptyDatabase } from '../factories/room';

type Handler = (event: RequestEvent) => Promise<Response>;
const handlers = import.meta.glob<Record<string, Handler>>('../../src/routes/api/**/+server.ts');

/** The names of every handler under `/api`, as the API's description has them: `GET /api/rooms/{room}/bins`. */
export async function everyHandler(): Promise<string[]> {
	const names = await Promise.all(
		Object.entries(handlers).map(async ([file, load]) =>
			Object.keys(await load()).map((method) => `${method} ${pathOf(file).replace(/\[(\w+)\]/g, '{$1}')}`)
		)
	);
	return names.flat();
}

/** A database that the handlers use, as the running server would. */
export async function servedDatabase(): Promise<Database> {
	settle(readEnv({ ORIGIN: 'http://paperlarder.test', AUTH_SECRET: 'Zt3kq9LxB7vWm2RdYc8uHnPf5sGa1JeQ' }));
	const database = await emptyDatabase();
	connect(database);
	return database;
}

/** Asks a handler as the actor, or as a visitor: `ask('GET /api/rooms/{room}/bins', actor)`. */
export async function ask(
	name: string,
	who: Actor | null,
	{
		body,
		type = 'application/json',
		room = who?.roomId ?? '',
		id = '',
		search = ''
	}: { body?: unknown; type?: string; room?: string; id?: string; search?: string } = {}
): Promise<Response> {
	const [method = '', path = ''] = name.split(' ');
	const file = Object.keys(handlers).find((one) => pathOf(one).replace(/\[(\w+)\]/g, '{$1}') === path);
	const handler = file && (await handlers[file]!())[method];
	if (!handler) throw new Error(`There is no handler for ${name}.`);
	const url = new URL(path.replace('{room}', room).replace('{id}', id) + search, 'http://paperlarder.test');
	const sent = typeof body === 'string' ? body : JSON.stringify(body);
	const request = new Request(url, {
		method,
		...(body === undefined ? {} : { body: sent, headers: { 'content-type': type } })
	});
	const person = { id: who?.userId ?? '', email: '', name: '', siteRole: 'none' as const };
	return handler({
		...{ request, url, params: { room, id } },
		locals: { requestId: '', user: who && person, session: who && { id: '', roomId: who.roomId } },
		setHeaders: () => {}
	} as unknown as RequestEvent);
}

function pathOf(file: string): string {
	return file.slice(file.indexOf('/api/'), -'/+server.ts'.length);
}
