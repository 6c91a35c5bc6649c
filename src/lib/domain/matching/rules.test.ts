import { describe, expect, it } from 'vitest';
import {
	aBill,
	aPiece,
	aRequest,
	aSheet,
	aSlot,
	aTape,
	aTool,
	inches
} from '../../../../tests/factories/stash';
import type { Bill } from '../bill/bill';
import { matchProjects, type MatchRequest } from './index';
import type { Supply } from '../stash';
import type { ProjectResult } from './verdict';

function match(bill: Bill, supplies: readonly Supply[], some: Partial<MatchRequest> = {}): ProjectResult {
	const { results } = matchProjects(aRequest({ bills: [bill], supplies, ...some }), { work: 10_000_000 });
	return results[0] as ProjectResult;
}

const oneSlot = (w: number, h: number, qty = 1, slot = {}, piece = {}) =>
	aBill('project', { slots: [aSlot('s', slot)], pieces: [aPiece('p', 's', w, h, { qty, ...piece })] });
const directional = { faces: [{ design: 'Fern', direction: 'one-way' as const }] };

describe('the worked example', () => {
	const tagbook = (up: 'h' | 'none') =>
		aBill('tagbook', {
			slots: [aSlot('cover'), aSlot('tags', { sameAs: 'cover' })],
			pieces: [aPiece('c', 'cover', 11, 7, { up }), aPiece('t', 'tags', 2.375, 4, { up, qty: 6 })]
		});

	it('takes two sheets upright, proved', () => {
		const result = match(tagbook('h'), [aSheet('fern', { ...directional, sheets: 2 })]);
		expect(result).toMatchObject({ verdict: 'now', plan: { proof: 'minimum' } });
		expect(result.plan?.sheets).toHaveLength(2);
	});

	it('lacks one tag and one sheet with one', () => {
		const result = match(tagbook('h'), [aSheet('fern', directional)]);
		expect(result.verdict).toBe('short');
		expect(result.short).toMatchObject([
			{ line: 'slots/tags', pieces: { t: 1 }, sheets: [{ w: 97536, h: 97536, count: 1 }] }
		]);
		expect(result.plan?.sheets[0]?.placements).toHaveLength(6);
	});

	it('takes one sheet where nothing has an up', () => {
		const result = match(tagbook('none'), [aSheet('fern', directional)]);
		expect(result).toMatchObject({ verdict: 'now', plan: { proof: 'minimum' } });
		expect(result.plan?.sheets).toHaveLength(1);
	});
});

describe('papers', () => {
	it('binds an up only on a directional face and a piece that is not square', () => {
		const wide = aSheet('wide', { ...directional, w: inches(12), h: inches(6) });
		expect(match(oneSlot(6, 12, 1, {}, { up: 'h' }), [wide]).verdict).toBe('short');
		expect(match(oneSlot(6, 12, 1, {}, { up: 'w' }), [wide]).plan?.sheets[0]?.placements[0]?.turned).toBe(
			true
		);
		expect(match(oneSlot(6, 12, 1, {}, { up: 'h' }), [{ ...wide, faces: [] }]).verdict).toBe('now');
		expect(match(oneSlot(6, 6, 2, {}, { up: 'h' }), [wide]).verdict).toBe('now');
	});

	it('uses a described B-side and never one that nobody described', () => {
		const slot = { design: 'Oat' };
		const fern = { design: 'Fern', direction: 'none' as const };
		const both = aSheet('both', { faces: [fern, { design: 'Oat', direction: 'none' }] });
		expect(match(oneSlot(5, 5, 1, slot), [both]).plan?.sheets[0]?.placements[0]?.face).toBe('B');
		expect(match(oneSlot(5, 5, 1, slot), [aSheet('Oat', { faces: [fern] })]).verdict).toBe('short');
	});

	it('keeps a slot to one design unless it is mixed', () => {
		const two = [aSheet('fern'), aSheet('kite')];
		expect(match(oneSlot(12, 12, 2), two).verdict).toBe('short');
		expect(match(oneSlot(12, 12, 2, { designs: 'mixed' }), two).verdict).toBe('now');
		expect(match(oneSlot(12, 12, 1), two, { copies: { project: 2 } }).verdict).toBe('short');
	});

	it('knows a design by its collection and name', () => {
		const rows = [
			aSheet('Oat', { collection: 'Lane' }),
			aSheet('Oat', { key: 'other', collection: 'Field' })
		];
		expect(match(oneSlot(12, 12, 2), rows).verdict).toBe('short');
		expect(match(oneSlot(12, 12, 2), [rows[0]!, { ...rows[1]!, collection: 'Lane' }]).verdict).toBe('now');
	});

	it('honours the same design and different designs', () => {
		const bill = (second: object) =>
			aBill('project', {
				slots: [aSlot('a'), aSlot('b', second)],
				pieces: [aPiece('p', 'a', 12, 12), aPiece('q', 'b', 12, 12)]
			});
		const two = [aSheet('fern'), aSheet('kite')];
		expect(match(bill({ sameAs: 'a' }), two).verdict).toBe('short');
		expect(match(bill({ differentFrom: ['a'] }), two).verdict).toBe('now');
		expect(match(bill({ differentFrom: ['a'] }), [aSheet('fern', { sheets: 2 })]).verdict).toBe('short');
	});

	it('shares a sheet between slots, from either face', () => {
		const bill = aBill('project', {
			slots: [aSlot('a', { design: 'Fern' }), aSlot('b', { design: 'Oat' })],
			pieces: [aPiece('p', 'a', 12, 6), aPiece('q', 'b', 12, 6)]
		});
		const faces = ['Fern', 'Oat'].map((design) => ({ design, direction: 'none' as const }));
		const { plan } = match(bill, [aSheet('both', { faces })]);
		expect(plan?.sheets).toHaveLength(1);
		expect(plan?.sheets[0]?.placements.map(({ face }) => face).sort()).toEqual(['A', 'B']);
	});

	it('looks first for an unstated weight or an unsure count, only if it is needed', () => {
		const heavy = {
			material: {
				kind: 'patterned-paper' as const,
				weight: { min: { text: '120 gsm', gsm: 120 }, max: null },
				caliper: null
			}
		};
		expect(match(oneSlot(5, 5, 1, heavy), [aSheet('fern')]).lines[0]).toMatchObject({
			verdict: 'look',
			why: "the paper's weight isn't stated"
		});
		expect(
			match(oneSlot(5, 5, 1, heavy), [aSheet('fern', { weight: { text: '90 gsm', gsm: 90 } })]).verdict
		).toBe('short');
		const unsure = aSheet('kite', { count: 'unsure' });
		expect(match(oneSlot(5, 5), [unsure]).verdict).toBe('look');
		expect(match(oneSlot(5, 5), [unsure, aSheet('fern')]).verdict).toBe('now');
	});

	it('offers a sheet without its branding strip, which the first cut takes off', () => {
		const strip = { edge: 'top' as const, depth: inches(1 / 4) };
		const row = aSheet('kite', { h: inches(12.25), strip });
		const sheet = match(oneSlot(12, 12), [row]).plan?.sheets[0];
		expect(sheet?.cuts[0]).toEqual({
			axis: 'across',
			at: inches(1 / 4),
			of: { x: 0, y: 0, w: inches(12), h: inches(12.25) }
		});
		expect(sheet?.placements[0]).toMatchObject({ y: inches(1 / 4), noSlack: true });
		expect(match(oneSlot(12, 12.125), [row]).verdict).toBe('short');
	});

	it('cuts smaller only as far as needed, and calls it a swap', () => {
		const result = match(oneSlot(6.03125, 12, 2, {}, { up: 'h', allowance: inches(1 / 16) }), [
			aSheet('fern', directional)
		]);
		expect(result.verdict).toBe('swap');
		expect(result.plan?.sheets[0]?.placements.map(({ w, h }) => [w, h])).toEqual([
			[inches(6), inches(12)],
			[inches(6), inches(12)]
		]);
	});

	it('takes material swaps in the author’s order', () => {
		const swaps = (['vellum', 'cardstock'] as const).map((kind) => ({ kind, weight: null, caliper: null }));
		const rows = [aSheet('card', { kind: 'cardstock' }), aSheet('veil', { kind: 'vellum' })];
		expect(match(oneSlot(5, 5, 1, { swaps }), rows).lines[0]).toMatchObject({
			verdict: 'swap',
			swap: 0,
			supplies: ['veil']
		});
		expect(match(oneSlot(5, 5, 1, { swaps }), rows.slice(0, 1)).lines[0]).toMatchObject({
			verdict: 'swap',
			swap: 1
		});
	});

	it('ranks by the colour wished for and never decides by it', () => {
		const rows = [aSheet('red', { colours: ['#aa2222'] }), aSheet('green', { colours: ['#228822'] })];
		expect(match(oneSlot(5, 5, 1, { colour: '#118811' }), rows).lines[0]?.supplies).toEqual(['green']);
		expect(match(oneSlot(5, 5, 1, { colour: '#118811' }), rows.slice(0, 1)).verdict).toBe('now');
	});

	it('opens whole sheets by price only where all have one in one currency', () => {
		const priced = (key: string, amount: number) => aSheet(key, { price: { amount, currency: 'USD' } });
		expect(match(oneSlot(5, 5), [priced('dear', 90), priced('cheap', 40)]).lines[0]?.supplies).toEqual([
			'cheap'
		]);
		expect(match(oneSlot(5, 5), [priced('dear', 90), aSheet('free')]).lines[0]?.supplies).toEqual(['dear']);
	});

	it('takes offcuts before whole sheets', () => {
		const rows = [aSheet('whole'), aSheet('left', { w: inches(6), h: inches(6), offcut: true })];
		expect(match(oneSlot(5, 5), rows).lines[0]?.supplies).toEqual(['left']);
	});

	it('marks cuts beyond the trimmer’s reach for knife and ruler and leaves small offcuts out', () => {
		const options = { units: 'in' as const, kerf: 0, reach: inches(8), knife: false, keepOffcut: inches(6) };
		const sheet = match(oneSlot(12, 5), [aSheet('fern')], { options }).plan?.sheets[0];
		expect(sheet?.cuts).toMatchObject([{ axis: 'across', byKnife: true }]);
		expect(sheet?.offcuts).toEqual([{ x: 0, y: inches(5), w: inches(12), h: inches(7) }]);
	});
});

describe('missing paper', () => {
	it('is told in the owned size, else 12 × 12 or A4, else to measure', () => {
		const missing = (bill: Bill, rows: Supply[], units: 'in' | 'mm' = 'in') =>
			match(bill, rows, { options: { units, kerf: 0, reach: null, knife: false, keepOffcut: null } })
				.short[0];
		const letter = aSheet('letter', { w: inches(8.5), h: inches(11) });
		expect(missing(oneSlot(5, 8, 3), [letter])).toMatchObject({
			pieces: { p: 1 },
			sheets: [{ w: inches(8.5), h: inches(11), count: 1 }]
		});
		expect(missing(oneSlot(5, 5), [])).toMatchObject({
			sheets: [{ w: inches(12), h: inches(12), count: 1 }]
		});
		expect(missing(oneSlot(5, 5), [], 'mm')).toMatchObject({ sheets: [{ w: 67200, h: 95040, count: 1 }] });
		expect(missing(oneSlot(20, 5), [letter])).toMatchObject({
			sheets: [{ w: inches(20), h: inches(5), count: 1, custom: true }]
		});
	});

	it('is never told in an offcut’s size', () => {
		const left = aSheet('left', { w: inches(6), h: inches(6), offcut: true });
		expect(match(oneSlot(6, 6, 2), [left]).short).toMatchObject([
			{ pieces: { p: 1 }, sheets: [{ w: inches(12), h: inches(12), count: 1 }] }
		]);
	});

	it('says a near miss once, with its side and size', () => {
		const row = aSheet('close', { w: inches(5.96875), h: inches(12) });
		expect(match(oneSlot(6, 12, 1, {}, { up: 'h' }), [row]).near).toEqual([
			{ line: 'slots/s', supply: 'close', side: 'w', by: inches(1 / 32) }
		]);
		expect(match(oneSlot(6, 12.5), [row]).near).toEqual([]);
	});
});

describe('adhesives', () => {
	const bill = (need: number, some = {}) =>
		aBill('project', {
			adhesives: [
				{
					key: 'rim',
					name: 'rim',
					kind: 'tape',
					width: inches(1 / 4),
					need: inches(need),
					swaps: [],
					...some
				}
			]
		});

	it('add up over rolls of one width and are tight under a tenth left over', () => {
		const rolls = [
			aTape('a', { left: inches(50) }),
			aTape('b', { left: inches(48) }),
			aTape('wide', { width: inches(1 / 2) })
		];
		expect(match(bill(93), rolls).lines[0]).toMatchObject({
			verdict: 'now',
			need: 755904,
			left: 796544,
			tight: true
		});
		expect(match(bill(80), rolls).lines[0]).toMatchObject({ tight: false });
		expect(match(bill(100), rolls).short).toEqual([{ line: 'adhesives/rim', amount: inches(2) }]);
	});

	it('take a swap as many times as the author says', () => {
		const swaps = [{ kind: 'tape', width: inches(1 / 8), times: 2 }];
		const narrow = (left: number) => [aTape('narrow', { width: inches(1 / 8), left: inches(left) })];
		expect(match(bill(50, { swaps }), narrow(100)).lines[0]).toMatchObject({
			verdict: 'swap',
			swap: 0,
			need: inches(100)
		});
		expect(match(bill(50, { swaps }), narrow(99)).verdict).toBe('short');
	});

	it('are drawn in order, for every copy', () => {
		const two = aBill('project', {
			adhesives: [...bill(60).adhesives, { ...bill(30).adhesives[0]!, key: 'flap' }]
		});
		expect(match(two, [aTape('a')]).lines.map(({ left }) => left)).toEqual([inches(100), inches(40)]);
		expect(match(two, [aTape('a')], { copies: { project: 2 } }).verdict).toBe('short');
	});
});

describe('tools and dates', () => {
	const need = { name: '', reach: null, grooves: null, shape: null, size: null, cuts: [], swaps: [] };
	const tooled = (...tools: Bill['tools'][number][]) => aBill('project', { tools });
	const punch = { ...need, key: 'punch', kind: 'corner-punch' as const, shape: 'wave' };

	it('serve by shape, reach and grooves', () => {
		expect(match(tooled(punch), [aTool('cp', { kind: 'corner-punch', shape: 'round' })]).short).toEqual([
			{ line: 'tools/punch', tool: 'corner-punch' }
		]);
		const scored = aBill('project', {
			slots: [aSlot('s')],
			pieces: [aPiece('p', 's', 11, 7, { scores: [{ from: 'left', at: inches(5.5), fold: 'valley' }] })],
			tools: [{ ...need, key: 'board', kind: 'scoring-board' }]
		});
		const board = (reach: number, grooves: number) => [
			aSheet('fern'),
			aTool('sb', { kind: 'scoring-board', reach: inches(reach), grooves: inches(grooves) })
		];
		expect(match(scored, board(7, 1 / 2)).verdict).toBe('now');
		expect(match(scored, board(6, 1 / 2)).verdict).toBe('short');
		expect(match(scored, board(7, 1)).verdict).toBe('short');
	});

	it('wait for a lent tool or a delivery, borrowed tools included', () => {
		const lent = aTool('cp', { kind: 'corner-punch', shape: 'wave', lentUntil: '2027-05-12' });
		expect(match(tooled(punch), [lent])).toMatchObject({ verdict: 'after', after: '2027-05-12' });
		const trim = { ...need, key: 'trim', kind: 'trimmer' as const };
		const borrowed = (until: string) => aTool('tr', { borrowedUntil: until });
		expect(match(tooled(punch, trim), [lent, borrowed('2027-05-12')]).verdict).toBe('after');
		expect(match(tooled(punch, trim), [lent, borrowed('2027-05-11')])).toMatchObject({
			verdict: 'short',
			short: [{ line: 'tools/trim', tool: 'trimmer' }]
		});
		expect(match(oneSlot(5, 5), [aSheet('fern', { arrives: '2027-05-20' })])).toMatchObject({
			verdict: 'after',
			after: '2027-05-20'
		});
	});

	it('cut board even where the bill lists none, unless it is cut already', () => {
		const bill = oneSlot(4.5, 8.5, 2, { material: { kind: 'chipboard', weight: null, caliper: null } });
		const board = aSheet('board', { kind: 'chipboard' });
		const knife = aTool('kn', { kind: 'craft-knife', cuts: ['paper', 'board'] });
		expect(match(bill, [board]).short).toMatchObject([{ line: 'tools/board-cut' }]);
		expect(match(bill, [board, aTool('tr')]).verdict).toBe('short');
		expect(match(bill, [board, knife]).lines.at(-1)).toMatchObject({
			line: 'tools/board-cut',
			verdict: 'now',
			supplies: ['kn']
		});
		const cut = aSheet('cut', { kind: 'chipboard', w: inches(8.5), h: inches(4.5), sheets: 2 });
		expect(match(bill, [{ ...cut, name: 'board' }]).lines.map(({ line }) => line)).toEqual(['slots/s']);
	});
});

describe('time', () => {
	it('running out is a look, not a proof', () => {
		const { results } = matchProjects(aRequest({ bills: [oneSlot(5, 5)], supplies: [aSheet('fern')] }), {
			work: 0
		});
		expect(results[0]).toMatchObject({ verdict: 'look', short: [], plan: null });
	});
});
