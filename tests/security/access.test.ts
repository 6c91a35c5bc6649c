import { eq } from 'drizzle-orm';
import { mkdir, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';
import type { Database } from '../../src/lib/server/db/client';
import { supplies } from '../../src/lib/server/db/schema/supplies';
import type { Actor } from '../../src/lib/server/session';
import { openServersDatabase, signedIn } from '../factories/people';
import { project } from '../factories/project';
import { cardstock, stock } from '../factories/supply';
import { builtRoutes, pathOf } from '../setup/routes';
import { ACCESS, type Access } from './access';
import { Browser, type Answer } from './browser';

const ROLES = ['visitor', 'stranger', 'viewer', 'member', 'owner'] as const;
type Role = (typeof ROLES)[number];
const RANK: Partial<Record<Role | Access, number>> = { viewer: 0, member: 1, owner: 2 };

/** After these the browser or what it looks at is gone, so that nothing could be asked of it again. */
const ENDING = [/\?\/leave$/, /sign-out\?/, /\?\/trash$/, /^DELETE/];

let db: Database;
let built: { key: string; id: string }[];
beforeAll(async () => {
	db = await openServersDatabase();
	await mkdir(join(inject('server').folder, 'photos'), { recursive: true });
	await writeFile(join(inject('server').folder, 'photos', 'matrix.webp'), 'RIFF');
	built = builtRoutes().flatMap(({ id, page, methods, actions }) => [
		...(page ? [{ key: `GET ${id}`, id }] : []),
		...methods.map((method) => ({ key: `${method} ${id}`, id })),
		...actions.map((name) => ({ key: `POST ${id}?/${name}`, id }))
	]);
});
afterAll(() => db.close());

interface Scene {
	readonly browser: Browser;
	readonly params: Readonly<Record<string, string>>;
	readonly projectId: string;
}

/** A room with a supply and a project in it, and somebody who comes to it in that role. */
async function setScene(role: Role): Promise<Scene> {
	const owner = await signedIn(db);
	const actor: Actor = { userId: owner.id, roomId: owner.roomId, role: 'owner', seesPrices: true };
	const supplyId = await stock(db, actor, cardstock());
	const projectId = await project(db, actor);
	await db.write((tx) =>
		tx.update(supplies).set({ picture: 'matrix.webp' }).where(eq(supplies.id, supplyId))
	);
	const browser =
		role === 'owner'
			? owner.browser
			: role === 'visitor'
				? new Browser()
				: (await signedIn(db, role === 'stranger' ? {} : { room: owner.roomId, role })).browser;
	return { browser, projectId, params: { room: owner.roomId, id: supplyId, token: 'x'.repeat(43) } };
}

function ask({ browser, params, projectId }: Scene, key: string, id: string): Promise<Answer> {
	const [method = ''] = key.split(' ', 1);
	const [, action] = key.split('?/');
	const path = pathOf(id, id.includes('/projects/') ? { ...params, id: projectId } : params);
	if (method === 'GET') return browser.ask(path);
	if (id.startsWith('/api/')) return browser.send(method, path, {});
	return browser.post(action && action !== 'default' ? `${path}?/${action}` : path);
}

/** Past the door: served, or refused for what was sent. */
function letIn({ status, headers }: Answer): boolean {
	if (status >= 300 && status < 400) return !/^\/(sign-in\?next|room\/new)/.test(headers.location ?? '');
	return status < 300 || [400, 409, 415, 422].includes(status);
}

function mayEnter(role: Role, key: string, id: string): boolean {
	const access = ACCESS[key];
	if (access === 'anybody') return true;
	if (access === 'link' || role === 'visitor') return false;
	if (access === 'person') return true;
	// A stranger has a room of her own, and a page without an id is about that.
	if (role === 'stranger') return !/\[(room|id)\]/.test(id);
	return (RANK[role] ?? -1) >= (RANK[access ?? 'owner'] ?? 9);
}

describe('who may do what (ASVS 8.2.1)', () => {
	it('is said of every route, method and action that the build answers, and of nothing else', () => {
		expect(built.map(({ key }) => key).sort()).toEqual(Object.keys(ACCESS).sort());
	});

	it.each(ROLES)('holds for a %s, everywhere', async (role) => {
		const wrong: string[] = [];
		const ending = (key: string) => ENDING.some((pattern) => pattern.test(key));
		const scene = await setScene(role);
		for (const { key, id } of built) {
			const answer = await ask(ending(key) ? await setScene(role) : scene, key, id);
			if (answer.status >= 500 || letIn(answer) !== mayEnter(role, key, id)) {
				wrong.push(`${key} (${ACCESS[key]}): ${answer.status} ${answer.headers.location ?? ''}`);
			}
		}
		expect(wrong).toEqual([]);
	});

	it.each(['visitor', 'stranger'] as const)('holds for the data behind pages, for a %s', async (role) => {
		const scene = await setScene(role);
		for (const { key, id } of built.filter(({ key }) => key.startsWith('GET /(app)'))) {
			if (mayEnter(role, key, id) || id.endsWith('/picture')) continue;
			const path = pathOf(
				id,
				id.includes('/projects/') ? { ...scene.params, id: scene.projectId } : scene.params
			);
			const { text } = await scene.browser.ask(`${path}/__data.json`);
			const data = JSON.parse(text) as { type: string; nodes?: { type: string }[] };
			const refused = data.type === 'redirect' || data.nodes?.at(-1)?.type === 'error';
			expect(refused, `${path}: ${text.slice(0, 200)}`).toBe(true);
		}
	});
});
