import { describe, expect, it } from 'vitest';
import { bestOfSheet, checkPlan, cutMost, planCuts } from '../../src/lib/domain/cutting';
import {
	LIES,
	type CutProblem,
	type Lie,
	type PieceKind,
	type SheetKind
} from '../../src/lib/domain/cutting/problem';
import { INCH, MILLIMETRE } from '../../src/lib/domain/length';

const budget = { work: 20_000_000 };

function sheetOf(w: number, h: number, count = 1): SheetKind {
	return { w, h, count, cost: [1, 0] };
}

function pieceOf(w: number, h: number, qty: number, lie: Lie): PieceKind {
	return { w, h, qty, lies: [lie] };
}

function planned(problem: CutProblem) {
	const answer = planCuts(problem, budget);
	if (answer.status !== 'planned') return answer.status;
	expect(checkPlan(problem, answer.plan)).toEqual([]);
	expect(answer.minimum).toBe(true);
	return answer.plan.cost[0];
}

/** l x w, profit, demand as the source lists them. */
type Row = readonly [l: number, w: number, profit: number, demand: number];

interface Knapsack {
	readonly name: string;
	readonly plate: readonly [number, number];
	readonly rows: readonly Row[];
	readonly fixed: number;
	readonly turned: number;
}

/**
 * GuillotineModels.jl (Becker, Araujo & Buriol, 2023), test/run_model_solving_tests.jl at 26bdc81b: guillotine
 * knapsack instances with any number of stages and their optima, pieces as given. The optima with quarter turns
 * were recomputed with a HiGHS plate model, gcut1's by an exact subset programme; cgcut1 and gcut1 turned also
 * stand in packingsolver's data_knapsack_rotation.csv at f1ec8964. Instances cgcut1: Christofides & Whitlock
 * 1977; gcut1: Beasley 1985; CHL5: Cung, Hifi & Le Cun.
 */
const KNAPSACKS: readonly Knapsack[] = [
	{ name: 'plate 1x1', plate: [1, 1], rows: [[1, 1, 1, 1]], fixed: 1, turned: 1 },
	{
		name: 'two halves beat one efficient piece',
		plate: [10, 20],
		rows: [
			[10, 10, 10, 2],
			[10, 11, 19, 1]
		],
		fixed: 20,
		turned: 20
	},
	{
		name: 'needs a turn to fill',
		plate: [16, 20],
		rows: [
			[10, 8, 10, 2],
			[10, 16, 19, 1]
		],
		fixed: 20,
		turned: 39
	},
	{ name: 'a hundred tens', plate: [100, 100], rows: [[10, 10, 7, 100]], fixed: 700, turned: 700 },
	{ name: 'only fifty wanted', plate: [100, 100], rows: [[10, 10, 7, 50]], fixed: 350, turned: 350 },
	{
		name: 'cgcut1',
		plate: [15, 10],
		rows: [
			[8, 4, 66, 2],
			[3, 7, 35, 1],
			[8, 2, 24, 3],
			[3, 4, 17, 5],
			[3, 3, 11, 2],
			[3, 2, 8, 2],
			[2, 1, 2, 1]
		],
		fixed: 244,
		turned: 260
	},
	{
		name: 'CHL5',
		plate: [20, 20],
		rows: [
			[14, 2, 28, 1],
			[1, 5, 5, 1],
			[20, 4, 80, 2],
			[12, 3, 36, 3],
			[11, 8, 88, 2],
			[11, 6, 66, 2],
			[7, 9, 63, 1],
			[17, 5, 85, 1],
			[7, 14, 98, 2],
			[1, 7, 7, 3]
		],
		fixed: 390,
		turned: 400
	},
	{
		name: 'gcut1',
		plate: [250, 250],
		rows: [
			[167, 184, 30728, 1],
			[114, 118, 13452, 1],
			[167, 152, 25384, 1],
			[83, 140, 11620, 1],
			[70, 86, 6020, 1],
			[143, 166, 23738, 1],
			[120, 160, 19200, 1],
			[66, 148, 9768, 1],
			[87, 141, 12267, 1],
			[69, 165, 11385, 1]
		],
		fixed: 48368,
		turned: 58136
	}
];

function mostValue({ plate, rows }: Knapsack, lie: Lie) {
	const pieces = rows.map(([l, w, , demand]) => pieceOf(l, w, demand, lie));
	const problem = { sheets: [sheetOf(...plate)], pieces, kerf: 0 };
	const values = rows.map(([, , profit]) => profit);
	const best = bestOfSheet(problem, values, budget);
	const cut = pieces.map((piece, p) => ({ ...piece, qty: best.counts[p] ?? 0 }));
	expect(checkPlan({ ...problem, pieces: cut }, best.plan)).toEqual([]);
	expect(best.counts.reduce((sum, count, p) => sum + count * (values[p] ?? 0), 0)).toBe(best.value);
	return best;
}

describe('one sheet, most value', () => {
	it.each(KNAPSACKS)('$name: $fixed as given', (knapsack) => {
		expect(mostValue(knapsack, LIES.upright)).toMatchObject({ value: knapsack.fixed, proved: true });
	});

	it.each(KNAPSACKS)('$name: $turned with quarter turns', (knapsack) => {
		expect(mostValue(knapsack, LIES.either)).toMatchObject({ value: knapsack.turned, proved: true });
	});

	it('takes a dear piece once though two cheap copies of its size remain', () => {
		// packingsolver f1ec8964, data/rectangleguillotine/tests/knapsack_uo_bounded_copies: 100 + 1 = 101.
		const twins: Knapsack = {
			name: '',
			plate: [10, 5],
			rows: [
				[5, 5, 100, 1],
				[5, 5, 1, 2]
			],
			fixed: 101,
			turned: 101
		};
		expect(mostValue(twins, LIES.upright)).toMatchObject({ value: 101, proved: true });
	});
});

describe('kerf', () => {
	it('is counted between pieces and not at the edge: 21 x 5 gives two 10 x 5', () => {
		// packingsolver f1ec8964, data/rectangleguillotine/tests/knapsack_uo_cut_thickness: cut thickness 1, 2 pieces.
		const from = (kerf: number, qty: number) =>
			planned({ sheets: [sheetOf(21, 5)], pieces: [pieceOf(10, 5, qty, LIES.upright)], kerf });
		expect(from(1, 2)).toBe(1);
		expect(from(2, 2)).toBe('impossible');
	});

	it('fits exactly: four 24 x 9 on 34 x 29 with kerf 1', () => {
		// packingsolver f1ec8964, knapsack_2hvr_cut_thickness: 9+1+9+1+9 = 29 beside 24+1+9 = 34.
		const pieces = [pieceOf(9, 24, 4, LIES.either)];
		expect(planned({ sheets: [sheetOf(34, 29)], pieces, kerf: 1 })).toBe(1);
		expect(planned({ sheets: [sheetOf(33, 29)], pieces, kerf: 1 })).toBe('impossible');
	});

	it('fits exactly: strips of 4, 4, 9 and 19 across 39 with kerf 1', () => {
		// packingsolver f1ec8964, knapsack_1rvr_cut_thickness: 4+1+4+1+9+1+19 = 39; one strip 4 holds two pieces.
		const pieces = [
			pieceOf(9, 24, 1, LIES.either),
			pieceOf(4, 19, 1, LIES.either),
			pieceOf(4, 9, 1, LIES.either),
			pieceOf(4, 27, 1, LIES.either),
			pieceOf(19, 19, 1, LIES.either)
		];
		expect(planned({ sheets: [sheetOf(39, 29)], pieces, kerf: 1 })).toBe(1);
	});

	// floor((L + k) / (w + k)); arithmetic, and packingsolver's test above for the first row.
	it.each([
		{ length: 21, piece: 10, kerf: 1, pieces: 2 },
		{ length: 305, piece: 50, kerf: 0, pieces: 6 },
		{ length: 304.8, piece: 25.4, kerf: 0, pieces: 12 },
		{ length: 304.8, piece: 25.4, kerf: 0.5, pieces: 11 },
		{ length: 297, piece: 70, kerf: 1, pieces: 4 }
	])('$length mm gives $pieces of $piece mm with kerf $kerf mm', ({ length, piece, kerf, pieces }) => {
		const unit = (mm: number) => Math.round(mm * MILLIMETRE);
		const from = (qty: number) =>
			planned({
				sheets: [sheetOf(unit(length), unit(100))],
				pieces: [pieceOf(unit(piece), unit(100), qty, LIES.upright)],
				kerf: unit(kerf)
			});
		expect(from(pieces)).toBe(1);
		expect(from(pieces + 1)).toBe('impossible');
	});
});

describe('small published cases', () => {
	it('turns 10 x 5 to fit 5 x 10', () => {
		// packingsolver f1ec8964, data/rectangleguillotine/tests/knapsack_ur.
		const on = (lie: Lie) => planned({ sheets: [sheetOf(5, 10)], pieces: [pieceOf(10, 5, 1, lie)], kerf: 0 });
		expect(on(LIES.either)).toBe(1);
		expect(on(LIES.upright)).toBe('impossible');
	});

	it('cuts all four pieces from 20 x 15 less its trims', () => {
		// packingsolver f1ec8964, knapsack_uo_trims: trims 2+3 and 2+3 leave 15 x 10; 143 of 150 is sold.
		const pieces = [[10, 6] as const, [9, 4] as const, [5, 7] as const, [4, 3] as const].map(([w, h]) =>
			pieceOf(w, h, 1, LIES.upright)
		);
		expect(planned({ sheets: [sheetOf(15, 10)], pieces, kerf: 0 })).toBe(1);
	});

	it('needs one plate of 20 x 20', () => {
		// packingsolver f1ec8964, bin_packing_3nvo.
		const pieces = [pieceOf(10, 20, 1, 1), pieceOf(5, 10, 2, 1), pieceOf(10, 10, 1, 1)];
		expect(planned({ sheets: [sheetOf(20, 20, Infinity)], pieces, kerf: 0 })).toBe(1);
	});

	it('needs two bars of 10 for 6, 6, 4 and 4', () => {
		// packingsolver f1ec8964, data/onedimensional/tests bin_packing_single_bin_type.
		expect(planned(bars(10, [6, 4], [2, 2]))).toBe(2);
	});
});

/** One-dimensional stock: pieces as wide as the sheet. */
function bars(stock: number, widths: readonly number[], demand: readonly number[]): CutProblem {
	return {
		sheets: [sheetOf(stock, 1, Infinity)],
		pieces: widths.map((width, i) => pieceOf(width, 1, demand[i] ?? 0, LIES.upright)),
		kerf: 0
	};
}

describe('grid counts (arithmetic)', () => {
	it.each([
		{ sheet: [304.8, 304.8] as const, piece: [107.95, 139.7] as const, asIs: 4, turned: 4 },
		{ sheet: [215.9, 279.4] as const, piece: [107.95, 139.7] as const, asIs: 4, turned: 2 },
		{ sheet: [297, 210] as const, piece: [148, 105] as const, asIs: 4, turned: 2 },
		{ sheet: [304.8, 304.8] as const, piece: [76.2, 76.2] as const, asIs: 16, turned: 16 },
		{ sheet: [215.9, 279.4] as const, piece: [88.9, 50.8] as const, asIs: 10, turned: 12 }
	])('$piece mm from $sheet mm: $asIs as given, $turned turned', ({ sheet, piece, asIs, turned }) => {
		const unit = (mm: number) => Math.round(mm * MILLIMETRE);
		const most = (lie: Lie) =>
			cutMost(
				{
					sheets: [sheetOf(unit(sheet[0]), unit(sheet[1]))],
					pieces: [pieceOf(unit(piece[0]), unit(piece[1]), 40, lie)],
					kerf: 0
				},
				[0],
				budget
			);
		expect(most(LIES.upright)).toMatchObject({ counts: [asIs], proved: true });
		if (piece[0] !== piece[1]) expect(most(LIES.turned)).toMatchObject({ counts: [turned], proved: true });
	});
});

describe('common practice, no source', () => {
	const sheet = (count: number) => sheetOf(12 * INCH, 12 * INCH, count);

	it('nine squares of 3¾ in come out of a 12 x 12, so fifteen take two', () => {
		const squares = (qty: number, count: number) =>
			planned({
				sheets: [sheet(count)],
				pieces: [pieceOf(3.75 * INCH, 3.75 * INCH, qty, LIES.either)],
				kerf: 0
			});
		expect(squares(9, 1)).toBe(1);
		expect(squares(10, 1)).toBe('impossible');
		expect(squares(15, 5)).toBe(2);
	});

	it('two 4½ x 8½ boards and a ¾ x 8½ spine come out of a 12 x 12, and a third board never does', () => {
		const boards = (qty: number) =>
			planned({
				sheets: [sheet(1)],
				pieces: [
					pieceOf(4.5 * INCH, 8.5 * INCH, qty, LIES.either),
					pieceOf(0.75 * INCH, 8.5 * INCH, 1, LIES.either)
				],
				kerf: 0
			});
		expect(boards(2)).toBe(1);
		expect(boards(3)).toBe('impossible');
	});
});
