import type { Seat } from './components';
import type { CostOf } from './layout';
import type { Sheet } from './shelf';

/** Whole sheets first, by price where every candidate has one in one currency; then offcuts and remnants. */
export function costsOf(seats: readonly Seat[]): CostOf {
	const whole = seats
		.flatMap(({ uses }) => uses.map(({ sheet }) => sheet))
		.filter((sheet) => !isLeftover(sheet));
	const currency = whole[0]?.supply.price?.currency;
	const priced = whole.every(
		({ supply: { price } }) => price && price.amount > 0 && price.currency === currency
	);
	return (sheet) => {
		if (isLeftover(sheet)) return [0, 1];
		return [priced ? (sheet.supply.price?.amount ?? 1) : 1, 0];
	};
}

function isLeftover(sheet: Sheet): boolean {
	return sheet.supply.offcut || sheet.remnant;
}
