import { expect, it } from 'vitest';
import { Reckonings } from './reckonings';

it('reckons once for everybody until the room changes', async () => {
	const reckonings = new Reckonings<number>(4);
	let times = 0;
	const ask = (revision: number) => reckonings.of('room', revision, async () => ++times);
	expect(await Promise.all([ask(1), ask(1), ask(1)])).toEqual([1, 1, 1]);
	expect(await ask(2)).toBe(2);
	expect(await ask(2)).toBe(2);
});

it('tries again after a failure', async () => {
	const reckonings = new Reckonings<number>(4);
	await expect(reckonings.of('room', 1, () => Promise.reject(new Error('once')))).rejects.toThrow('once');
	expect(await reckonings.of('room', 1, async () => 7)).toBe(7);
});

it('forgets what was asked for longest ago', async () => {
	const reckonings = new Reckonings<string>(2);
	const done: string[] = [];
	const ask = (name: string) =>
		reckonings.of(name, 1, async () => {
			done.push(name);
			return name;
		});
	for (const name of ['a', 'b', 'a', 'c', 'a', 'b']) await ask(name);
	expect(done).toEqual(['a', 'b', 'c', 'b']);
});
