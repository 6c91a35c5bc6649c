import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { INCH, LONGEST_ROLL, MILLIMETRE, writeExact } from '../length';
import { measuresIn, workOut } from './formula';

const measures = new Map([
	['boardH', 6 * INCH],
	['turnIn', (5 * INCH) / 8],
	['gap', 2 * MILLIMETRE],
	['odd', 7]
]);
const worth = (formula: string) => {
	const worked = workOut(formula, measures, 'in');
	return worked.ok ? worked.value : worked.reason;
};

/** A formula that is a length, with what it is worth as a plain sum of whole numbers. */
const length: fc.Arbitrary<[string, number]> = fc
	.letrec<{ sum: [string, number] }>((tie) => ({
		sum: fc.oneof(
			{ maxDepth: 5 },
			fc.constantFrom(...measures).map(([name, value]) => [name, value] as [string, number]),
			fc
				.tuple(fc.integer({ min: 1, max: 100_000 }), fc.constantFrom('in', 'mm', 'cm'))
				.map(([value, unit]) => [writeExact(value, unit as 'in'), value] as [string, number]),
			fc.tuple(tie('sum'), tie('sum')).map(([[a, x], [b, y]]) => [`${a} + ${b}`, x + y] as [string, number]),
			fc
				.tuple(tie('sum'), tie('sum'))
				.map(([[a, x], [b, y]]) => [`${a} - (${b})`, x - y] as [string, number]),
			fc
				.tuple(fc.nat({ max: 9 }), tie('sum'))
				.map(([n, [a, x]]) => [`${n}*(${a})`, n * x] as [string, number]),
			tie('sum').map(([a, x]) => [`-(${a})`, -x] as [string, number]),
			fc
				.tuple(fc.integer({ min: 1, max: 9 }), tie('sum'))
				.map(([n, [a, x]]) => [`(${n} * (${a}) / ${n})`, x] as [string, number])
		)
	}))
	.sum.filter(([text]) => text.length <= 200);

describe('a formula', () => {
	it('is worth exactly what its sum is worth', () => {
		fc.assert(
			fc.property(length, ([formula, value]) => {
				const worked = workOut(formula, measures, 'in');
				expect(worked.ok).toBe(value > 0 && value <= LONGEST_ROLL);
				if (worked.ok) expect(worked.value).toBe(value);
			}),
			{ numRuns: 1000 }
		);
	});

	it('answers any text with a length or a reason', () => {
		const anything = fc.oneof(
			fc.string({ maxLength: 300 }),
			fc
				.array(
					fc.constantFrom('(', ')', '+', '-', '*', '/', ' ', '2', '3/8', 'in', 'mm', 'boardH', '.', '"', '½'),
					{ maxLength: 60 }
				)
				.map((parts) => parts.join(''))
		);
		fc.assert(
			fc.property(anything, (formula) => {
				const worked = workOut(formula, measures, 'cm');
				if (worked.ok) expect(Number.isSafeInteger(worked.value) && worked.value > 0).toBe(true);
				else expect(worked.reason).toMatch(/\.$/);
			}),
			{ numRuns: 2000 }
		);
	});

	it.each([
		['boardH', 6 * INCH],
		['boardH + 2*turnIn', 7.25 * INCH],
		['boardH + 2 × turnIn', 7.25 * INCH],
		['2 * (boardH - turnIn) − gap', 10.75 * INCH - 640],
		['boardH / 2', 3 * INCH],
		['boardH ÷ 2 + 1/4 in', 3.25 * INCH],
		['2 3/8 in + 1 mm', 2.375 * INCH + 320],
		['2⅜ in', 2.375 * INCH],
		['2 3/8 * boardH', 14.25 * INCH],
		[
			'boardH * turnIn / turnIn',
			'A length times a length is an area: one of the two must be a plain number.'
		],
		['boardH * (turnIn / turnIn)', 6 * INCH],
		['2,5 cm', 8000],
		['.5"', INCH / 2],
		['- (2 mm - boardH)', 6 * INCH - 640],
		['boardH + 2', 'A plain number can’t be added to a length: give it a unit.'],
		['2 * 3', 'The formula comes to a plain number. Give the lengths in it a unit.'],
		['2 / boardH', 'A plain number can’t be divided by a length.'],
		['boardH / (2 - 2)', 'The formula divides by zero.'],
		['boardH - boardH', 'The formula comes to nothing, or less. A length is more than zero.'],
		['wall', 'There is no measure called “wall” above this one.'],
		['constructor', 'There is no measure called “constructor” above this one.'],
		['(boardH', 'A bracket is opened and not closed.'],
		['boardH turnIn', 'The formula stops making sense at “turnIn”.'],
		['boardH +', 'The formula ends where a number or a measure is expected.'],
		['', 'The formula is empty.'],
		['boardH ** 2', 'A number or a measure is expected at “* 2”.'],
		[
			'odd / 2',
			'The formula comes to a length that can’t be measured out exactly. The nearest that can: 0.009375 mm or 0.0125 mm; by the ruler, 1/64 in.'
		],
		['99999999999999999999 * boardH', 'The formula comes to more than 10 km.']
	])('%s is %s', (formula, expected) => {
		expect(worth(formula)).toBe(expected);
	});

	it('nests only so deep and runs only so long', () => {
		expect(worth(`${'('.repeat(16)}boardH${')'.repeat(16)}`)).toBe(6 * INCH);
		expect(worth(`${'('.repeat(17)}boardH${')'.repeat(17)}`)).toBe('The formula nests too deep.');
		expect(worth(`${'-'.repeat(90)}boardH`)).toBe('The formula nests too deep.');
		expect(worth('boardH+'.repeat(1000))).toBe('A formula has at most 200 characters.');
	});

	it('names its measures and not its units', () => {
		expect(measuresIn('=boardH + 2 in + 2*turnIn - boardH / 3 + 4"')).toEqual(['boardH', 'turnIn']);
	});
});
