import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
	anyBill as bill,
	anyOptions,
	anyRow as row,
	anyStash as stash
} from '../../../../tests/factories/any-room';
import { aRequest, aTape, aTool, inches } from '../../../../tests/factories/stash';
import type { Bill } from '../bill/bill';
import { readDocument } from '../exchange';
import { INCH } from '../length';
import type { SheetSupply } from '../stash';
import { matchProjects, type MatchRequest } from './index';
import { isWorse } from './slot-lines';
import type { ProjectResult } from './verdict';

function match(
	one: Bill,
	supplies: MatchRequest['supplies'],
	some: Partial<MatchRequest> = {}
): ProjectResult {
	const { results } = matchProjects(aRequest({ bills: [one], supplies, ...some }), { work: 50_000_000 });
	return results[0] as ProjectResult;
}

const sheetsOf = ({ plan }: ProjectResult) => plan?.sheets.length ?? 0;
const countsOf = ({ verdict, plan }: ProjectResult) => [verdict, plan?.proof, plan?.sheets.length];
const kept = { name: '', swaps: [] };
const consumed = fc.record({
	needs: fc.array(fc.integer({ min: 10, max: 90 }), { maxLength: 3 }).map((needs) =>
		needs.map((need, i) => ({
			...kept,
			key: `rim-${i}`,
			kind: 'tape' as const,
			width: i === 0 ? null : inches(1 / 4),
			need: inches(need)
		}))
	),
	rolls: fc
		.array(fc.integer({ min: 20, max: 120 }), { maxLength: 2 })
		.map((rolls) => rolls.map((left, i) => aTape(`roll-${i}`, { left: inches(left) }))),
	tools: fc.subarray(['trimmer', 'corner-punch'] as const).map((kinds) =>
		kinds.map((kind) => ({
			...kept,
			key: kind,
			kind,
			reach: null,
			grooves: null,
			shape: null,
			size: null,
			cuts: []
		}))
	),
	owned: fc.subarray([aTool('trimmer'), aTool('punch', { kind: 'corner-punch', lentUntil: '2027-05-20' })])
});

/** Prices decide by cost: only without them is the number of sheets what a plan keeps down. */
const unpriced = (rows: readonly SheetSupply[]) => rows.map((supply) => ({ ...supply, price: null }));

function reversed({ pieces, slots, adhesives, tools, extras, ...some }: Bill): Bill {
	const back = <T>(list: readonly T[]) => [...list].reverse();
	return {
		...some,
		pieces: back(pieces),
		slots: back(slots),
		adhesives: back(adhesives),
		tools: back(tools),
		extras: back(extras)
	};
}

/** The room as its exchange document gives it, every length written in that unit. */
function matchDocument(one: Bill, rows: readonly SheetSupply[], unit: 'in' | 'mm'): ProjectResult {
	const written = (length: number) =>
		unit === 'in' ? `${length / INCH} in` : `${((length / INCH) * 254) / 10} mm`;
	const sized = (w: number, h: number) => `${written(w).replace(/ \w+$/, '')} x ${written(h)}`;
	const supplies = rows.map(
		({ key, kind, name, w, h, sheets, count, faces, offcut, arrives, price, strip }) => ({
			key,
			kind,
			name,
			size: sized(w, h),
			sheets,
			count,
			...(faces.length > 0 ? { faces } : {}),
			offcut,
			...(arrives ? { arrives } : {}),
			...(price ? { price } : {}),
			...(strip ? { brandingStrip: { edge: strip.edge, depth: written(strip.depth) } } : {})
		})
	);
	const project = {
		key: one.key,
		name: one.name,
		slots: one.slots.map(({ key, material, designs, sameAs, differentFrom }) => ({
			key,
			material: { kind: material.kind },
			designs,
			...(sameAs ? { sameAs } : {}),
			differentFrom
		})),
		pieces: one.pieces.map(({ key, slot, w, h, qty, up }) => ({
			key,
			slot,
			w: written(w),
			h: written(h),
			qty,
			up
		}))
	};
	const read = readDocument({ format: 'paperlarder', version: 1, supplies, projects: [project] }, unit);
	return match(read.bills[0] as Bill, read.supplies);
}

const runs = { numRuns: 60 };

describe('matching', () => {
	it('lays every piece once, inside, apart, the print’s way up, from sheets that are there', () => {
		fc.assert(
			fc.property(bill, stash, anyOptions, (one, rows, options) => {
				const result = match(one, rows, { options });
				const placed = (result.plan?.sheets ?? []).flatMap((sheet) =>
					sheet.placements.map((at) => ({ sheet, at }))
				);
				for (const { sheet, at } of placed) {
					const [piece, supply] = [
						one.pieces.find(({ key }) => key === at.piece),
						rows.find(({ key }) => key === sheet.supply)
					];
					if (!piece || !supply) throw new Error('a placement names nothing');
					expect([at.w, at.h]).toEqual(at.turned ? [piece.h, piece.w] : [piece.w, piece.h]);
					expect(at.x + at.w <= supply.w && at.y + at.h <= supply.h && sheet.nth <= supply.sheets).toBe(true);
					const face = supply.faces[at.face === 'A' ? 0 : 1];
					expect(face !== undefined || supply.faces.length === 0).toBe(true);
					if (face && face.direction !== 'none' && piece.up !== 'none' && piece.w !== piece.h)
						expect(at.turned).toBe(piece.up === 'w');
					const others = sheet.placements.filter((other) => other !== at);
					expect(
						others.every(
							(b) =>
								at.x + at.w + options.kerf <= b.x ||
								b.x + b.w + options.kerf <= at.x ||
								at.y + at.h + options.kerf <= b.y ||
								b.y + b.h + options.kerf <= at.y
						)
					).toBe(true);
				}
				expect(new Set(result.plan?.sheets.map(({ supply, nth }) => `${supply} ${nth}`)).size).toBe(
					sheetsOf(result)
				);
				if (result.verdict === 'short') return;
				for (const { key, qty } of one.pieces)
					expect(placed.filter(({ at }) => at.piece === key)).toHaveLength(qty);
			}),
			runs
		);
	});

	it('never does worse with more in the stash, nor with fewer pieces', () => {
		fc.assert(
			fc.property(bill, stash, row, (one, rows, more) => {
				const { verdict } = match(one, rows);
				expect(isWorse(match(one, [...rows, { ...more, key: 'more' }]).verdict, verdict)).toBe(false);
				expect(isWorse(match({ ...one, pieces: one.pieces.slice(1) }, rows).verdict, verdict)).toBe(false);
			}),
			runs
		);
	});

	it('says short exactly where it lacks something', () => {
		fc.assert(
			fc.property(bill, stash, (one, rows) => {
				const { verdict, short } = match(one, rows);
				expect(verdict === 'short').toBe(short.length > 0);
				for (const lack of short)
					expect('sheets' in lack && lack.sheets.every(({ count }) => count > 0)).toBe(true);
			}),
			runs
		);
	});

	it('changes nothing but names where keys are renamed', () => {
		fc.assert(
			fc.property(bill, stash, (one, rows) => {
				const renamed = match(
					one,
					rows.map((supply) => ({ ...supply, key: `x${supply.key}` }))
				);
				const text = JSON.stringify(renamed).replaceAll('xrow-', 'row-');
				expect(JSON.parse(text)).toEqual(JSON.parse(JSON.stringify(match(one, rows))));
			}),
			runs
		);
	});

	it('keeps verdict, number of sheets and proof where rows and lines of every kind stand in another order', () => {
		fc.assert(
			fc.property(bill, stash, consumed, (one, rows, { needs, rolls, tools, owned }) => {
				const whole: Bill = { ...one, adhesives: needs, tools };
				const supplies = [...unpriced(rows), ...rolls, ...owned];
				const [forward, backward] = [match(whole, supplies), match(reversed(whole), [...supplies].reverse())];
				expect(backward.verdict).toBe(forward.verdict);
				if (forward.lines.some(({ line, verdict }) => line.startsWith('slots/') && verdict === 'short'))
					return;
				expect(countsOf(backward)).toEqual(countsOf(forward));
			}),
			runs
		);
	});

	it('plans the same from a document in inches and from one in their exact millimetres', () => {
		fc.assert(
			fc.property(bill, stash, (one, rows) => {
				const [imperial, metric] = [matchDocument(one, rows, 'in'), matchDocument(one, rows, 'mm')];
				expect(metric.plan).toEqual(imperial.plan);
				expect([metric.verdict, metric.lines]).toEqual([imperial.verdict, imperial.lines]);
			}),
			runs
		);
	});

	it('opens at least as many sheets for a copy more', () => {
		fc.assert(
			fc.property(bill, stash, fc.integer({ min: 1, max: 2 }), (one, rows, copies) => {
				const whole = unpriced(rows).map((supply) => ({ ...supply, offcut: false, sheets: 4 }));
				const [fewer, more] = [copies, copies + 1].map((n) => match(one, whole, { copies: { project: n } }));
				if (!fewer || !more || more.verdict !== fewer.verdict || more.verdict === 'short') return;
				if (fewer.plan?.proof === 'minimum') expect(sheetsOf(more)).toBeGreaterThanOrEqual(sheetsOf(fewer));
			}),
			runs
		);
	});
});
