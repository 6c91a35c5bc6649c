import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readBill } from '../exchange';
import { INCH, writeExact } from '../length';
import { proofread, type Finding } from './proofreader';

interface Line {
	[field: string]: unknown;
}
interface Written {
	[field: string]: unknown;
	slots: Line[];
	pieces: Line[];
	tools: Line[];
	adhesives: Line[];
}

/** A bill that has all it needs, for a test to take from or add to. */
function written(pieces: Line[], more: Partial<Written> = {}): Written {
	return {
		key: 'case',
		name: 'Cased book',
		slots: [{ key: 'paper', material: { kind: 'cardstock' } }],
		pieces: pieces.map((piece) => ({ slot: 'paper', ...piece })),
		adhesives: [{ key: 'rim', kind: 'tape', need: '10 m' }],
		tools: [
			{ key: 'trim', kind: 'trimmer', cuts: ['paper', 'board'] },
			{ key: 'score', kind: 'scoring-tool' }
		],
		...more
	};
}

const findingsIn = (bill: Written) => proofread(readBill(bill, 'in'), 'in');
const rulesIn = (bill: Written) => findingsIn(bill).map(({ rule }) => rule);

/** Puts a mend's value where its path says. */
function mended(bill: Written, { mend }: Finding): Written {
	const copy = structuredClone(bill);
	const steps = mend.change!.path.split('.');
	const last = steps.pop()!;
	const at = steps.reduce<Line>((part, step) => part[step] as Line, copy);
	at[last] = mend.change!.value;
	return copy;
}

function mendedAll(bill: Written): Finding[] {
	for (let round = 0; round < 6; round++) {
		const finding = findingsIn(bill).find(({ mend }) => mend.change);
		if (!finding) break;
		bill = mended(bill, finding);
	}
	return findingsIn(bill);
}

const side = fc.integer({ min: 16, max: 40 * 16 }).map((sixteenths) => (sixteenths * INCH) / 16);
const small = fc.integer({ min: 1, max: 16 }).map((sixteenths) => (sixteenths * INCH) / 16);
const text = (length: number) => writeExact(length, 'in');

describe('a case wrap', () => {
	// Common practice, no source: the sheet is boards + hinge gaps + two turn-ins.
	const wrapped = fc.record({ boardW: side, boardH: side, spineW: small, gap: small, turnIn: small });
	type Wrapped = typeof wrapped extends fc.Arbitrary<infer T> ? T : never;
	const sum = ({ boardW, boardH, spineW, gap, turnIn }: Wrapped) => ({
		w: 2 * boardW + spineW + 2 * gap + 2 * turnIn,
		h: boardH + 2 * turnIn
	});
	const bill = (parts: Wrapped, { w, h }: { w: number; h: number }) =>
		written(
			[
				{ key: 'board', slot: 'board', w: text(parts.boardW), h: text(parts.boardH), qty: 2 },
				{ key: 'spine', slot: 'board', w: text(parts.spineW), h: text(parts.boardH) },
				{
					key: 'wrap',
					w: text(w),
					h: text(h),
					wraps: {
						boards: ['board', 'spine', 'board'],
						gaps: [text(parts.gap), text(parts.gap)],
						turnIn: text(parts.turnIn)
					}
				}
			],
			{
				slots: [
					{ key: 'paper', material: { kind: 'kraft-paper' } },
					{ key: 'board', material: { kind: 'chipboard' } }
				]
			}
		);
	const about = (findings: readonly Finding[]) => findings.filter(({ rule }) => rule === 'wrap-adds-up');

	it('adds up when its sheet is boards, hinge gaps and two turn-ins, and only then', () => {
		fc.assert(
			fc.property(
				wrapped,
				fc.integer({ min: -40, max: 40 }),
				fc.integer({ min: -40, max: 40 }),
				(parts, dw, dh) => {
					const right = sum(parts);
					const off = { w: right.w + dw * 127, h: right.h + dh * 127 };
					fc.pre(off.w > 0 && off.h > 0);
					expect(about(findingsIn(bill(parts, right)))).toEqual([]);
					expect(about(findingsIn(bill(parts, off)))).toHaveLength(Number(dw !== 0) + Number(dh !== 0));
					expect(about(mendedAll(bill(parts, off)))).toEqual([]);
				}
			),
			{ numRuns: 60 }
		);
	});

	it('says both figures and the mend', () => {
		const parts = {
			boardW: 4.5 * INCH,
			boardH: 8.5 * INCH,
			spineW: 0.75 * INCH,
			gap: INCH / 4,
			turnIn: 0.625 * INCH
		};
		const [finding] = about(findingsIn(bill(parts, { w: 11 * INCH, h: 9.75 * INCH })));
		expect(finding).toEqual({
			line: 'pieces/wrap',
			rule: 'wrap-adds-up',
			severity: 'mend',
			message:
				'“wrap” is 11 in wide, but boards 9 3⁄4 in + hinge gaps 1⁄2 in + two turn-ins 1 1⁄4 in come to 11 1⁄2 in.',
			mend: { text: 'Make it 11 1⁄2 in wide.', change: { path: 'pieces.2.w', value: '11 1/2 in' } }
		});
	});

	it('needs as many boards as it covers, and a gap between each two', () => {
		const parts = { boardW: 4 * INCH, boardH: 6 * INCH, spineW: INCH, gap: INCH / 4, turnIn: INCH / 2 };
		const right = bill(parts, sum(parts));
		expect(rulesIn(right)).toEqual([]);
		right.pieces[0]!['qty'] = 1;
		expect(findingsIn(right)).toMatchObject([
			{
				line: 'pieces/board',
				rule: 'count-differs',
				severity: 'mend',
				mend: { change: { path: 'pieces.0.qty', value: 2 } }
			}
		]);
		right.pieces[0]!['qty'] = 2;
		(right.pieces[2]!['wraps'] as { gaps: string[] }).gaps = ['1/2 in'];
		expect(findingsIn(right)).toMatchObject([
			{ rule: 'wrap-gaps', message: '3 boards have 2 hinge gaps; the bill gives 1.' }
		]);
	});
});

describe('a mat', () => {
	const mounted = (base: Line, piece: Line) =>
		written([
			{ key: 'base', ...base },
			{ key: 'mat', ...piece }
		]);
	const aboutMat = (bill: Written) =>
		findingsIn(bill).filter(({ rule }) => ['mount-too-big', 'mat-border', 'mat-uneven'].includes(rule));

	// Common practice, no source: a mat shows the same border on every side.
	it('shows the border asked for on every side, or is told how to', () => {
		fc.assert(
			fc.property(
				side,
				side,
				small,
				fc.integer({ min: -9, max: 9 }),
				fc.integer({ min: -9, max: 9 }),
				(w, h, border, dw, dh) => {
					const to = { w: w + dw * 127, h: h + dh * 127 };
					const base = { w: text(w + 2 * border), h: text(h + 2 * border) };
					const even = mounted(base, { w: text(w), h: text(h), mount: { on: 'base', border: text(border) } });
					expect(aboutMat(even)).toEqual([]);
					const lying = mounted(base, {
						w: text(h),
						h: text(w),
						mount: { on: 'base', border: text(border) }
					});
					expect(aboutMat(lying)).toEqual([]);
					const off = mounted(base, {
						w: text(to.w),
						h: text(to.h),
						mount: { on: 'base', border: text(border) }
					});
					const turnedRight = to.w === h && to.h === w;
					if ((dw !== 0 || dh !== 0) && !turnedRight) expect(aboutMat(off)).toHaveLength(1);
					expect(mendedAll(off).filter(({ rule }) => rule.startsWith('m'))).toEqual([]);
				}
			),
			{ numRuns: 60 }
		);
	});

	it('sits within what it is mounted on, whichever way it is turned', () => {
		fc.assert(
			fc.property(side, side, side, side, (w, h, baseW, baseH) => {
				const bill = mounted(
					{ w: text(baseW), h: text(baseH) },
					{ w: text(w), h: text(h), mount: { on: 'base' } }
				);
				const fits = (w <= baseW && h <= baseH) || (h <= baseW && w <= baseH);
				expect(aboutMat(bill).some(({ rule }) => rule === 'mount-too-big')).toBe(!fits);
				expect(mendedAll(bill).some(({ rule }) => rule === 'mount-too-big')).toBe(false);
			}),
			{ numRuns: 100 }
		);
	});

	it('may be a panel’s, where its base is scored', () => {
		const base = { w: '8 1/2 in', h: '5 1/2 in', scores: [{ from: 'left', at: '4 1/4 in' }] };
		const panel = { w: '4 in', h: '5 1/4 in', mount: { on: 'base', border: '1/8 in' } };
		expect(rulesIn(mounted(base, panel))).toEqual([]);
	});

	it('is asked about where it shows unevenly', () => {
		const [finding] = aboutMat(
			mounted({ w: '4 1/4 in', h: '5 1/2 in' }, { w: '4 in', h: '5 in', mount: { on: 'base' } })
		);
		expect(finding).toMatchObject({
			severity: 'ask',
			message:
				'A mat shows the same border on every side, but here 1⁄8 in shows left and right, 1⁄4 in above and below.',
			mend: {
				text: 'Make it 5 1⁄4 in high, and 1⁄8 in shows all round.',
				change: { path: 'pieces.1.h', value: '5 1/4 in' }
			}
		});
		expect(
			aboutMat(mounted({ w: '8 in', h: '8 in' }, { w: '8 in', h: '2 in', mount: { on: 'base' } }))
		).toEqual([]);
	});

	it('is as many as what it covers, or a multiple', () => {
		const bill = (qty: number) =>
			mounted({ w: '4 in', h: '4 in', qty: 4 }, { w: '3 in', h: '3 in', qty, mount: { on: 'base' } });
		expect(rulesIn(bill(8))).toEqual([]);
		expect(findingsIn(bill(3))).toMatchObject([
			{
				rule: 'count-differs',
				message: 'There are 3 of “mat” for 4 of “base”.',
				mend: { change: { value: 4 } }
			}
		]);
	});
});

describe('scores, cuts and punches', () => {
	it('a score is on its piece exactly when it is nearer than the far edge', () => {
		fc.assert(
			fc.property(side, side, fc.constantFrom('left', 'right', 'top', 'bottom'), side, (w, h, from, at) => {
				const bill = written([{ key: 'c', w: text(w), h: text(h), scores: [{ from, at: text(at) }] }]);
				const across = from === 'left' || from === 'right' ? w : h;
				expect(rulesIn(bill).includes('score-outside')).toBe(at >= across);
			})
		);
	});

	it.each<[string, Written]>([
		[
			'score-twice',
			written([
				{
					key: 'c',
					w: '6 in',
					h: '4 in',
					scores: [
						{ from: 'left', at: '2 in' },
						{ from: 'right', at: '4 in' }
					]
				}
			])
		],
		[
			'diagonal-outside',
			written([
				{
					key: 'c',
					w: '6 in',
					h: '4 in',
					diagonals: [{ from: { x: '0', y: '0' }, to: { x: '6 in', y: '5 in' } }]
				}
			])
		],
		[
			'diagonal-nowhere',
			written([
				{ key: 'c', w: '6 in', h: '4 in', diagonals: [{ from: { x: '0', y: '0' }, to: { x: '0', y: '0' } }] }
			])
		],
		[
			'scorer-not-listed',
			written([{ key: 'c', w: '6 in', h: '4 in', scores: [{ from: 'top', at: '2 in' }] }], {
				tools: [{ key: 't', kind: 'trimmer' }]
			})
		],
		['cutter-not-listed', written([{ key: 'c', w: '6 in', h: '4 in' }], { tools: [] })],
		[
			'board-cutter-not-listed',
			written([{ key: 'c', w: '6 in', h: '4 in' }], {
				tools: [{ key: 't', kind: 'trimmer' }],
				slots: [{ key: 'paper', material: { kind: 'chipboard' } }]
			})
		],
		[
			'punch-other-kind',
			written([{ key: 'c', w: '6 in', h: '4 in', corners: [{ at: ['top-left'], tool: 'score' }] }])
		],
		[
			'score-between-grooves',
			written([{ key: 'c', w: '6 in', h: '4 in', scores: [{ from: 'top', at: '1 1/16 in' }] }], {
				tools: [
					{ key: 't', kind: 'trimmer' },
					{ key: 's', kind: 'scoring-board', grooves: '1/8 in' }
				]
			})
		],
		[
			'step-tool-not-listed',
			written([{ key: 'c', w: '6 in', h: '4 in' }], {
				steps: [{ text: 'Press the lid shut.', tools: ['bone-folder'] }]
			})
		],
		[
			'step-piece-missing',
			written([{ key: 'c', w: '6 in', h: '4 in' }], { steps: [{ text: 'Fold the lid.', pieces: ['lid'] }] })
		],
		[
			'slot-without-pieces',
			written([{ key: 'c', w: '6 in', h: '4 in' }], {
				slots: [
					{ key: 'paper', material: { kind: 'cardstock' } },
					{ key: 'liner', material: { kind: 'vellum' } }
				]
			})
		],
		[
			'same-and-different',
			written(
				[
					{ key: 'c', w: '6 in', h: '4 in' },
					{ key: 'd', slot: 'b', w: '6 in', h: '4 in' }
				],
				{
					slots: [
						{ key: 'paper', material: { kind: 'cardstock' } },
						{ key: 'b', material: { kind: 'cardstock' }, sameAs: 'paper', differentFrom: ['paper'] }
					]
				}
			)
		],
		[
			'same-paper-other-kind',
			written(
				[
					{ key: 'c', w: '6 in', h: '4 in' },
					{ key: 'd', slot: 'b', w: '6 in', h: '4 in' }
				],
				{
					slots: [
						{ key: 'paper', material: { kind: 'cardstock' } },
						{ key: 'b', material: { kind: 'vellum' }, sameAs: 'paper' }
					]
				}
			)
		],
		['piece-oversize', written([{ key: 'c', w: '28 in', h: '4 in' }])],
		['measure-unused', written([{ key: 'c', w: '6 in', h: '4 in' }], { measures: { spare: '1 in' } })],
		[
			'adhesive-not-listed',
			written(
				[
					{ key: 'c', w: '6 in', h: '4 in' },
					{ key: 'd', w: '3 in', h: '2 in', mount: { on: 'c' } }
				],
				{ adhesives: [] }
			)
		]
	])('%s is found alone, and mended where a mend is offered', (rule, bill) => {
		const [finding, ...others] = findingsIn(bill);
		expect(others).toEqual([]);
		expect(finding?.rule).toBe(rule);
		expect(finding?.message).toMatch(/\.$/);
		if (finding?.mend.change) expect(findingsIn(mended(bill, finding))).toEqual([]);
	});
});

describe('tape', () => {
	const edges = fc.uniqueArray(fc.constantFrom('top', 'bottom', 'left', 'right'), { minLength: 1 });

	it('is enough exactly when the taped edges add up to no more', () => {
		fc.assert(
			fc.property(
				side,
				side,
				edges,
				fc.integer({ min: 1, max: 20 }),
				fc.integer({ min: -3, max: 3 }),
				(w, h, at, qty, off) => {
					const total =
						qty * at.reduce((sum, edge) => sum + (edge === 'top' || edge === 'bottom' ? w : h), 0);
					const bill = written(
						[{ key: 'c', w: text(w), h: text(h), qty, tape: { line: 'rim', edges: at } }],
						{ adhesives: [{ key: 'rim', kind: 'tape', need: text(total + off) }] }
					);
					const short = findingsIn(bill).filter(({ rule }) => rule === 'tape-too-little');
					expect(short).toHaveLength(off < 0 ? 1 : 0);
					for (const finding of short)
						expect(rulesIn(mended(bill, finding))).not.toContain('tape-too-little');
				}
			)
		);
	});

	it('that isn’t listed is told how much it is', () => {
		const bill = written([
			{ key: 'c', w: '11 in', h: '7 in', tape: { line: 'double', edges: ['top', 'left', 'bottom', 'right'] } }
		]);
		const [finding] = findingsIn(bill);
		expect(finding).toMatchObject({
			line: 'pieces/c',
			rule: 'tape-not-listed',
			message: 'Taped edges of “c” add up to 36 in of “double”, which isn’t among the adhesives.',
			mend: { change: { path: 'adhesives.1', value: { key: 'double', kind: 'tape', need: '36 in' } } }
		});
		expect(findingsIn(mended(bill, finding!))).toEqual([]);
	});
});

describe('keys', () => {
	it('used twice are found in a bill made by hand', () => {
		const bill = readBill(written([{ key: 'c', w: '6 in', h: '4 in' }]), 'in');
		const findings = proofread({ ...bill, pieces: [...bill.pieces, ...bill.pieces] });
		expect(findings).toMatchObject([
			{ line: 'pieces/c', rule: 'key-twice', mend: { change: { path: 'pieces.1.key', value: 'c-2' } } }
		]);
	});

	it('of tools that a bill made by hand doesn’t list are found', () => {
		const punched = { key: 'c', w: '6 in', h: '4 in', edges: [{ at: ['top'], tool: 'lace' }] };
		const listed = readBill(
			written([punched], {
				tools: [
					{ key: 'trim', kind: 'trimmer' },
					{ key: 'lace', kind: 'edge-punch' }
				]
			}),
			'in'
		);
		expect(proofread(listed)).toEqual([]);
		expect(proofread({ ...listed, tools: listed.tools.slice(0, 1) })).toMatchObject([
			{
				line: 'pieces/c',
				rule: 'punch-not-listed',
				mend: {
					text: 'List an edge punch among the tools.',
					change: { path: 'tools.1', value: { key: 'lace', kind: 'edge-punch' } }
				}
			}
		]);
	});
});
