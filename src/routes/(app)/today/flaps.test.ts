import { expect, test } from 'vitest';
import type { Verdict } from '$lib/domain/matching/verdict';
import { flapsOf } from './flaps';

const row = (key: string, verdict: Verdict) => ({
	project: { id: key, key, name: key, bill: { key, name: key, slots: [], pieces: [] } },
	result: {
		project: key,
		copies: 1,
		verdict,
		after: null,
		nowIfFirst: false,
		lines: [],
		short: [],
		near: [],
		plan: null
	}
});
const rows = [row('a', 'short'), row('b', 'now'), row('c', 'look'), row('d', 'now')];
const keys = (mode: 'each' | 'queue') => flapsOf({ mode, rows }).map(({ key }) => key);

test('each on its own, the best lie on top and equals keep the queue’s order', () => {
	expect(keys('each')).toEqual(['b', 'd', 'c', 'a']);
});

test('in order, the queue decides', () => {
	expect(keys('queue')).toEqual(['a', 'b', 'c', 'd']);
});
