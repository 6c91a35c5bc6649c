import { SHEET_KINDS, SUPPLY_MEASURES, TOOL_KINDS } from '$lib/domain/stash';
import { describe, expect, it } from 'vitest';
import { alikeKinds, FAMILIES, groupOf, measureOf } from './kinds';

const KINDS = [
	...SHEET_KINDS,
	...(Object.keys(SUPPLY_MEASURES) as (keyof typeof SUPPLY_MEASURES)[]),
	...TOOL_KINDS
];

describe('families of kinds', () => {
	it('hold every kind once, in the group that it is of', () => {
		const listed = FAMILIES.flatMap(({ kinds }) => kinds);
		expect([...listed].sort()).toEqual([...KINDS].sort());
		for (const { group, kinds } of FAMILIES) expect(kinds.map(groupOf)).toEqual(kinds.map(() => group));
	});

	it('let a kind be changed only into one that is measured alike', () => {
		for (const kind of KINDS) {
			const alike = alikeKinds(kind);
			expect(alike).toContain(kind);
			expect(new Set(alike.map((other) => `${groupOf(other)} ${measureOf(other)}`)).size).toBe(1);
		}
	});
});
