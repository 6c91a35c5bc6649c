/** GS1 modulo 10: weights 3, 1, 3, … from the right-most digit of the payload. */
export function checkDigit(payload: string): number {
	const sum = [...payload]
		.reverse()
		.reduce((total, digit, place) => total + Number(digit) * (place % 2 === 0 ? 3 : 1), 0);
	return (10 - (sum % 10)) % 10;
}

/** Of any length, digits only: GTIN-8, -12, -13, -14 and SSCC share the rule. */
export function checkDigitHolds(code: string): boolean {
	return /^\d{2,}$/.test(code) && checkDigit(code.slice(0, -1)) === Number(code.at(-1));
}
