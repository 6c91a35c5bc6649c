import { describe, expect, it } from 'vitest';
import { addressWith } from './address';

describe('an address with a filter changed', () => {
	const url = new URL('https://room.example/supplies?/move&q=fern&page=3&bin=&did=1');

	it('keeps the other filters and starts at the first page', () => {
		expect(addressWith(url, { kind: 'tape' })).toBe('/supplies?q=fern&kind=tape');
	});

	it('leaves out what was cleared, the action and the notice', () => {
		expect(addressWith(url, { q: null })).toBe('/supplies');
		expect(addressWith(url, { q: '' })).toBe('/supplies');
	});
});
