/** An exact fraction in lowest terms; `under` is always more than zero. */
export interface Fraction {
	readonly over: bigint;
	readonly under: bigint;
}

export function fraction(over: bigint, under = 1n): Fraction {
	const sign = under < 0n ? -1n : 1n;
	const shared = greatestCommonDivisor(over < 0n ? -over : over, under < 0n ? -under : under);
	return { over: (sign * over) / shared, under: (sign * under) / shared };
}

export function add(a: Fraction, b: Fraction): Fraction {
	return fraction(a.over * b.under + b.over * a.under, a.under * b.under);
}

export function multiply(a: Fraction, b: Fraction): Fraction {
	return fraction(a.over * b.over, a.under * b.under);
}

export function divide(a: Fraction, b: Fraction): Fraction {
	return fraction(a.over * b.under, a.under * b.over);
}

export function negate(a: Fraction): Fraction {
	return { over: -a.over, under: a.under };
}

function greatestCommonDivisor(a: bigint, b: bigint): bigint {
	while (b !== 0n) [a, b] = [b, a % b];
	return a;
}
