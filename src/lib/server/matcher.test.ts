import { resolve } from 'node:path';
import { afterEach, expect, it } from 'vitest';
import { TooMany } from './errors';
import { openMatcher, type Matcher } from './matcher';

const host = resolve('tests/fakes/matcher-host.mjs');
let matcher: Matcher;
afterEach(() => matcher.close());

const ask = (request: object, budgetMs = 1000, rank?: 'room' | 'visitor') =>
	matcher.ask({ request, today: '2027-05-10' }, budgetMs, rank);
const said = (say: string) => expect.objectContaining({ response: expect.objectContaining({ say }) });

it('answers many questions by few threads, each its own', async () => {
	matcher = openMatcher(host, 2);
	const words = Array.from({ length: 20 }, (_, nth) => `answer ${nth}`);
	const replies = await Promise.all(words.map((say) => ask({ say }, 1000, 'room')));
	expect(replies).toEqual(words.map(said));
});

it('answers rooms before visitors', async () => {
	matcher = openMatcher(host, 1);
	const order: string[] = [];
	const note = async (say: string, rank: 'room' | 'visitor') => {
		await ask({ say }, 1000, rank);
		order.push(say);
	};
	await Promise.all([note('v1', 'visitor'), note('v2', 'visitor'), note('r1', 'room'), note('r2', 'room')]);
	expect(order).toEqual(['v1', 'r1', 'r2', 'v2']);
});

it('never lets visitors hold every thread', async () => {
	matcher = openMatcher(host, 2);
	const endless = Promise.allSettled([ask({ loop: true }, 60_000), ask({ loop: true }, 60_000)]);
	expect(await ask({ say: 'a room’s' }, 1000, 'room')).toEqual(said('a room’s'));
	await matcher.close();
	expect((await endless).map(({ status }) => status)).toEqual(['rejected', 'rejected']);
});

it('ends a thread that doesn’t come back, and goes on with another', async () => {
	matcher = openMatcher(host, 1, 50);
	await expect(ask({ loop: true }, 50)).rejects.toBeInstanceOf(TooMany);
	expect(await ask({ say: 'still here' })).toEqual(said('still here'));
});

it('goes on with another thread when one falls over', async () => {
	matcher = openMatcher(host, 1);
	const [fallen, next] = await Promise.allSettled([ask({ fall: true }), ask({ say: 'still here' })]);
	expect(fallen).toMatchObject({ status: 'rejected', reason: { message: 'fell over' } });
	expect(next).toMatchObject({ status: 'fulfilled', value: said('still here') });
});

it('turns visitors away when too many wait', async () => {
	matcher = openMatcher(host, 1);
	const replies = await Promise.allSettled(Array.from({ length: 40 }, () => ask({ say: 'x', wait: 5 })));
	const refused = replies.filter(({ status }) => status === 'rejected');
	expect(refused.length).toBeGreaterThan(0);
	expect(refused.every((reply) => (reply as PromiseRejectedResult).reason instanceof TooMany)).toBe(true);
	expect(replies[0]).toMatchObject({ status: 'fulfilled' });
});

it('answers on this thread where there is no built host', async () => {
	matcher = openMatcher('/nowhere/match.js');
	const reply = await ask({ projects: [], supplies: [] });
	expect(reply).toEqual({ ok: true, response: { unit: '1/320 mm', results: [] } });
});
