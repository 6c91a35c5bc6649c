import fc from 'fast-check';
import type { CutProblem, Lie } from '../../src/lib/domain/cutting/problem';

/** Small problems of every sort: several sheet kinds, offcuts, limits, kerf, pieces that may turn here and not there. */
export function cutProblems(most: { pieces: number } = { pieces: 7 }): fc.Arbitrary<CutProblem> {
	const side = fc.integer({ min: 1, max: 9 });
	const sheet = fc.record({
		w: fc.integer({ min: 4, max: 12 }),
		h: fc.integer({ min: 4, max: 12 }),
		count: fc.constantFrom(1, 1, 2, 3, Infinity),
		cost: fc.constantFrom([1, 0] as const, [1, 0] as const, [0, 1] as const, [3, 1] as const)
	});
	const lie = fc.constantFrom<Lie>(0, 1, 2, 3, 3, 3);
	return fc.array(sheet, { minLength: 1, maxLength: 3 }).chain((sheets) =>
		fc.record({
			sheets: fc.constant(sheets),
			pieces: fc
				.array(
					fc.record({
						w: side,
						h: side,
						qty: fc.integer({ min: 1, max: 3 }),
						lies: fc.array(lie, { minLength: sheets.length, maxLength: sheets.length })
					}),
					{ minLength: 1, maxLength: 4 }
				)
				.filter((pieces) => pieces.reduce((sum, { qty }) => sum + qty, 0) <= most.pieces),
			kerf: fc.constantFrom(0, 0, 0, 1, 2)
		})
	);
}

export function scaled(problem: CutProblem, by: number): CutProblem {
	return {
		...problem,
		kerf: problem.kerf * by,
		sheets: problem.sheets.map((sheet) => ({ ...sheet, w: sheet.w * by, h: sheet.h * by })),
		pieces: problem.pieces.map((piece) => ({ ...piece, w: piece.w * by, h: piece.h * by }))
	};
}

export function transposed(problem: CutProblem): CutProblem {
	return {
		...problem,
		sheets: problem.sheets.map((sheet) => ({ ...sheet, w: sheet.h, h: sheet.w })),
		pieces: problem.pieces.map((piece) => ({ ...piece, w: piece.h, h: piece.w }))
	};
}
