/** Facts of the trade: common practice, no source. */
import { describe, expect, it } from 'vitest';
import type { Bill } from '../../src/lib/domain/bill/bill';
import { matchProjects } from '../../src/lib/domain/matching';
import type { Supply } from '../../src/lib/domain/stash';
import { aBill, aPiece, aRequest, aSheet, aSlot, aTool, inches } from '../factories/stash';

function match(bill: Bill, supplies: readonly Supply[]) {
	const { results } = matchProjects(aRequest({ bills: [bill], supplies }), { work: 20_000_000 });
	return results[0];
}

const knife = aTool('knife', { kind: 'craft-knife', cuts: ['paper', 'board'] });
const boards = (covers: number) =>
	aBill('case', {
		slots: [aSlot('board', { material: { kind: 'chipboard', weight: null, caliper: null } })],
		pieces: [aPiece('cover', 'board', 4.5, 8.5, { qty: covers }), aPiece('spine', 'board', 0.75, 8.5)]
	});

describe('what comes out of a 12 × 12 in sheet (common practice, no source)', () => {
	it('nine squares of 3¾ in, so that fifteen take two sheets', () => {
		const squares = (qty: number) =>
			aBill('squares', { slots: [aSlot('s')], pieces: [aPiece('p', 's', 3.75, 3.75, { qty })] });
		expect(match(squares(9), [aSheet('fern')])?.verdict).toBe('now');
		expect(match(squares(10), [aSheet('fern')])).toMatchObject({
			verdict: 'short',
			short: [{ pieces: { p: 1 } }]
		});
		const fifteen = match(squares(15), [aSheet('fern', { sheets: 5 })]);
		expect(fifteen?.plan).toMatchObject({ proof: 'minimum' });
		expect(fifteen?.plan?.sheets).toHaveLength(2);
	});

	it('two 4½ × 8½ in boards and a ¾ in spine, and never a third board', () => {
		const sheet = aSheet('board', { kind: 'chipboard' });
		expect(match(boards(2), [sheet, knife])?.verdict).toBe('now');
		expect(match(boards(3), [sheet, knife])).toMatchObject({
			verdict: 'short',
			short: [{ line: 'slots/board' }]
		});
	});

	it('four card fronts of 5½ × 4¼ in from a letter sheet, nothing left', () => {
		const letter = aSheet('letter', { kind: 'cardstock', w: inches(8.5), h: inches(11) });
		const cards = aBill('cards', {
			slots: [aSlot('s', { material: { kind: 'cardstock', weight: null, caliper: null } })],
			pieces: [aPiece('p', 's', 5.5, 4.25, { qty: 4 })]
		});
		expect(match(cards, [letter])?.plan?.sheets[0]).toMatchObject({ offcuts: [] });
	});
});
