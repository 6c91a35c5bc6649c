/** A fraction as typed, not reduced; `d` is never negative. */
export interface Rational {
	readonly n: bigint;
	readonly d: bigint;
}

const MIXED = /^(?:(\d+)(?: ?- ?| ))?(\d+) ?\/ ?(\d+)$/;
const DECIMAL = /^(\d*)(?:[.,](\d+))?$/;

/** Reads `6 3/8`, `6-3/8`, `9/8`, `6.375`, `6,375` or `.5`; null where anything is left over. */
export function readRational(text: string): Rational | null {
	const mixed = MIXED.exec(text);
	if (mixed) {
		const [whole, n, d] = [mixed[1] ?? '0', mixed[2] ?? '', mixed[3] ?? ''].map(BigInt) as [
			bigint,
			bigint,
			bigint
		];
		return { n: whole * d + n, d };
	}
	const decimal = DECIMAL.exec(text);
	if (!decimal || text === '') return null;
	const places = decimal[2] ?? '';
	return { n: BigInt(`${decimal[1] ?? ''}${places}`), d: 10n ** BigInt(places.length) };
}

/** Writes n/d (both positive whole numbers) as `6 3/8`, `3/8` or `6`. */
export function writeMixed(n: number, d: number): string {
	const whole = Math.floor(n / d);
	const rest = n % d;
	if (rest === 0) return String(whole);
	const shared = greatestCommonDivisor(rest, d);
	const fraction = `${rest / shared}/${d / shared}`;
	return whole === 0 ? fraction : `${whole} ${fraction}`;
}

/** Writes n/d in full, as `16.2`; d has no factor but 2 and 5, so that the digits end (within twenty places here). */
export function writeDecimal(n: number, d: number): string {
	const whole = Math.floor(n / d);
	const rest = n % d;
	if (rest === 0) return String(whole);
	const places = String((BigInt(rest) * 10n ** 20n) / BigInt(d)).padStart(20, '0');
	return `${whole}.${places.replace(/0+$/, '')}`;
}

export function greatestCommonDivisor(a: number, b: number): number {
	return b === 0 ? a : greatestCommonDivisor(b, a % b);
}
