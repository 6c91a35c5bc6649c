import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatMoney, isCurrency, minorDigits, parseMoney, totals, writeAmount } from './money';

const currencies = fc.constantFrom('USD', 'EUR', 'GBP', 'JPY', 'KWD', 'CLF', 'ISK', 'HUF');
const amounts = fc.integer({ min: 0, max: 99_999_999 });
const typed = (amount: number, places: number, mark: string) => {
	const digits = String(amount).padStart(places + 1, '0');
	return places === 0 ? digits : `${digits.slice(0, -places)}${mark}${digits.slice(-places)}`;
};

describe('laws', () => {
	it('reads every amount of minor units exactly, with a point or a comma', () => {
		fc.assert(
			fc.property(amounts, currencies, fc.constantFrom('.', ','), (amount, currency, mark) => {
				const read = parseMoney(typed(amount, minorDigits(currency), mark), currency);
				expect(read).toEqual({ ok: true, value: { amount, currency } });
			})
		);
	});

	it('reads back what it shows in dollars', () => {
		fc.assert(
			fc.property(amounts, (amount) => {
				const money = { amount, currency: 'USD' };
				expect(parseMoney(formatMoney(money), 'USD')).toEqual({ ok: true, value: money });
			})
		);
	});

	it('reads back what it writes to be typed, in any currency', () => {
		fc.assert(
			fc.property(amounts, fc.constantFrom('USD', 'CAD', 'MXN', 'JPY', 'KWD', 'CLF'), (amount, currency) => {
				const money = { amount, currency };
				expect(parseMoney(writeAmount(money), currency)).toEqual({ ok: true, value: money });
			})
		);
	});

	it('adds within a currency only, and loses nothing', () => {
		fc.assert(
			fc.property(fc.array(fc.record({ amount: amounts, currency: currencies })), (prices) => {
				const sums = totals(prices);
				expect(new Set(sums.map((sum) => sum.currency)).size).toBe(sums.length);
				for (const sum of sums) {
					const same = prices.filter((price) => price.currency === sum.currency);
					expect(sum.amount).toBe(same.reduce((total, price) => total + price.amount, 0));
				}
				expect(totals([...prices].reverse())).toEqual(expect.arrayContaining(sums));
			})
		);
	});
});

it.each([
	['12.50', 'USD', 1250],
	['12,5', 'EUR', 1250],
	['$1,234.50', 'USD', 123_450],
	['1.234,50 €', 'EUR', 123_450],
	['12.50 USD', 'USD', 1250],
	['1500', 'JPY', 1500],
	['0', 'USD', 0],
	['.95', 'USD', 95]
])('reads %s in %s', (text, currency, amount) => {
	expect(parseMoney(text, currency)).toEqual({ ok: true, value: { amount, currency } });
});

it.each([
	['', 'USD', 'Type a price like 12.50.'],
	['free', 'USD', 'Type a price like 12.50.'],
	['1,500', 'USD', 'Type a price like 12.50.'],
	['1.2.3', 'USD', 'Type a price like 12.50.'],
	['12.5', 'JPY', 'JPY has no decimals. Type a whole number.'],
	['-3', 'USD', 'A price can’t be below zero.'],
	['99999999999999', 'USD', 'That is more than a price here can be. Check the number.']
])('refuses “%s” in %s with a reason', (text, currency, reason) => {
	expect(parseMoney(text, currency)).toEqual({ ok: false, reason });
});

it('shows as many decimals as the currency has', () => {
	expect(formatMoney({ amount: 95, currency: 'USD' })).toBe('$0.95');
	expect(formatMoney({ amount: 1500, currency: 'JPY' })).toBe('¥1,500');
	expect(formatMoney({ amount: 1234, currency: 'KWD' })).toBe('KWD\u00a01.234');
	expect(formatMoney({ amount: 1250, currency: 'EUR' }, 'de-DE')).toBe('12,50\u00a0€');
});

it('knows a currency from a word of three letters', () => {
	expect(['USD', 'EUR', 'JPY'].map(isCurrency)).toEqual([true, true, true]);
	expect(['ZZZ', 'usd', '', 'DOLLAR'].map(isCurrency)).toEqual([false, false, false, false]);
});
