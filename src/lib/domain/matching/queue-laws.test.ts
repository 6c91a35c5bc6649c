import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { anyBills, anyOptions, anyStash } from '../../../../tests/factories/any-room';
import { aRequest } from '../../../../tests/factories/stash';
import { matchProjects, type MatchRequest } from './index';
import type { PlannedPlacement, PlannedSheet, ProjectResult } from './verdict';

const room = fc.record({ bills: anyBills, supplies: anyStash, options: anyOptions });
const queued = (some: Partial<MatchRequest>): readonly ProjectResult[] =>
	matchProjects(aRequest({ ...some, mode: 'queue' }), { work: 20_000_000 }).results;

/** Every promised sheet once, with the pieces that any plan shows on it. */
function promisedSheets(results: readonly ProjectResult[]): Map<string, PlannedSheet> {
	const promised = new Map<string, PlannedSheet>();
	for (const { plan } of results.filter(({ verdict }) => verdict !== 'short')) {
		for (const sheet of plan?.sheets ?? []) {
			const name = `${sheet.supply} ${sheet.nth}`;
			const known = promised.get(name)?.placements ?? [];
			const added = sheet.placements.filter((at) => !known.some((other) => isSame(other, at)));
			promised.set(name, { ...sheet, placements: [...known, ...added] });
		}
	}
	return promised;
}

function isSame(a: PlannedPlacement, b: PlannedPlacement): boolean {
	return a.project === b.project && a.piece === b.piece && a.x === b.x && a.y === b.y;
}

function overlaps(a: PlannedPlacement, b: PlannedPlacement, kerf: number): boolean {
	return a.x < b.x + b.w + kerf && b.x < a.x + a.w + kerf && a.y < b.y + b.h + kerf && b.y < a.y + a.h + kerf;
}

/** Some edge-to-edge cut parts the pieces, and each side comes apart in its turn. */
function comesApart(placements: readonly PlannedPlacement[], kerf: number): boolean {
	if (placements.length < 2) return true;
	const sides = (['x', 'y'] as const).flatMap((from) => {
		const size = from === 'x' ? 'w' : 'h';
		return placements.map((one) => {
			const at = one[from] + one[size];
			return [
				placements.filter((other) => other[from] + other[size] <= at),
				placements.filter((other) => other[from] >= at + kerf)
			] as const;
		});
	});
	return sides.some(
		([near, far]) =>
			far.length > 0 &&
			near.length + far.length === placements.length &&
			comesApart(near, kerf) &&
			comesApart(far, kerf)
	);
}

describe('a queue of any small room', () => {
	it('promises no part of a sheet twice, all of them together come apart, and nothing is left out', () => {
		fc.assert(
			fc.property(room, ({ bills, supplies, options }) => {
				const results = queued({ bills, supplies, options });
				for (const sheet of promisedSheets(results).values()) {
					const { placements } = sheet;
					const clash = placements.some((a, i) =>
						placements.slice(i + 1).some((b) => overlaps(a, b, options.kerf))
					);
					expect(clash).toBe(false);
					if (!options.knife) expect(comesApart(placements, options.kerf)).toBe(true);
					expect(sheet.nth).toBeLessThanOrEqual(
						supplies.find(({ key }) => key === sheet.supply)?.sheets ?? 0
					);
				}
				for (const [i, { verdict, plan, project }] of results.entries()) {
					if (verdict === 'short' || plan === null) continue;
					const laid = plan.sheets.flatMap(({ placements }) => placements);
					for (const { key, qty } of bills[i]?.pieces ?? [])
						expect(laid.filter((at) => at.project === project && at.piece === key)).toHaveLength(qty);
				}
			}),
			{ numRuns: 60 }
		);
	});

	it('shows a shared sheet alike in every plan that has a part in it', () => {
		fc.assert(
			fc.property(room, ({ bills, supplies, options }) => {
				const results = queued({ bills, supplies, options }).filter(({ verdict }) => verdict !== 'short');
				const shown = new Map<string, string>();
				for (const sheet of results.flatMap(({ plan }) => plan?.sheets ?? [])) {
					const name = `${sheet.supply} ${sheet.nth}`;
					expect(shown.get(name) ?? JSON.stringify(sheet)).toBe(JSON.stringify(sheet));
					shown.set(name, JSON.stringify(sheet));
				}
			}),
			{ numRuns: 40 }
		);
	});

	it('gives the first project what it would have alone', () => {
		fc.assert(
			fc.property(room, ({ bills, supplies, options }) => {
				const [alone] = matchProjects(aRequest({ bills: bills.slice(0, 1), supplies, options }), {
					work: 20_000_000
				}).results;
				expect(queued({ bills, supplies, options })[0]?.verdict).toBe(alone?.verdict);
			}),
			{ numRuns: 40 }
		);
	});
});
