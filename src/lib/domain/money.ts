/** Whole minor units of an ISO 4217 currency. */
export interface Money {
	readonly amount: number;
	readonly currency: string;
}
export type MoneyRead =
	{ readonly ok: true; readonly value: Money } | { readonly ok: false; readonly reason: string };

export function isCurrency(code: string): boolean {
	return CURRENCIES.has(code);
}

/** Reads `12.50`, `12,50`, `$1,234.50` or `12.50 USD` as an amount of `currency`; zero is a gift, and allowed. */
export function parseMoney(text: string, currency: string): MoneyRead {
	const figures = text.replaceAll(currency, '').replace(SIGNS, '').replace(/[\s']/g, '');
	const places = minorDigits(currency);
	if (figures.startsWith('-') || figures.startsWith('−')) return refuse('A price can’t be below zero.');
	const [, grouped = '', digits] = AMOUNT.exec(figures) ?? [];
	const whole = grouped.replace(/[.,]/g, '');
	if (whole === '' && digits === undefined) return refuse(`Type a price like ${example(places)}.`);
	if (digits !== undefined && digits.length > places) {
		return refuse(
			places === 0
				? `${currency} has no decimals. Type a whole number.`
				: `Type a price like ${example(places)}.`
		);
	}
	const amount = Number(`${whole}${(digits ?? '').padEnd(places, '0')}`);
	if (amount > LARGEST) return refuse('That is more than a price here can be. Check the number.');
	return { ok: true, value: { amount, currency } };
}

export function formatMoney({ amount, currency }: Money, locale = 'en-US'): string {
	const places = minorDigits(currency);
	return new Intl.NumberFormat(locale, {
		style: 'currency',
		currency,
		minimumFractionDigits: places,
		maximumFractionDigits: places
	}).format(amount / 10 ** places);
}

/** Typeable, in any currency: `12.50`, `1250`, `12.500`. */
export function writeAmount({ amount, currency }: Money): string {
	const places = minorDigits(currency);
	const digits = String(amount).padStart(places + 1, '0');
	return places === 0 ? digits : `${digits.slice(0, -places)}.${digits.slice(-places)}`;
}

/** One total for each currency, in the order they first come; amounts of two currencies are never added. */
export function totals(prices: readonly Money[]): Money[] {
	const sums = new Map<string, number>();
	for (const { amount, currency } of prices) sums.set(currency, (sums.get(currency) ?? 0) + amount);
	return [...sums].map(([currency, amount]) => ({ amount, currency }));
}

/** Digits after the point, ISO 4217. Not asked of Intl, whose locale data differs from the standard and changes. */
export function minorDigits(currency: string): number {
	return OTHER_DIGITS.get(currency) ?? 2;
}

function example(places: number): string {
	return (12.5).toFixed(places);
}

function refuse(reason: string): MoneyRead {
	return { ok: false, reason };
}

const SIGNS = /[$€£¥₩₹]/g;
/** A whole part that may be grouped by threes only where decimals follow with the other mark, then the decimals. */
const AMOUNT = /^(\d{1,3}(?:,\d{3})+(?=\.)|\d{1,3}(?:\.\d{3})+(?=,)|\d*)(?:[.,](\d+))?$/;
const LARGEST = 1e12;
const CURRENCIES: ReadonlySet<string> = new Set(Intl.supportedValuesOf('currency'));
const OTHER_DIGITS = new Map<string, number>([
	...'BIF CLP DJF GNF ISK JPY KMF KRW PYG RWF UGX UYI VND VUV XAF XOF XPF'
		.split(' ')
		.map((code) => [code, 0] as const),
	...'BHD IQD JOD KWD LYD OMR TND'.split(' ').map((code) => [code, 3] as const),
	...'CLF UYW'.split(' ').map((code) => [code, 4] as const)
]);
