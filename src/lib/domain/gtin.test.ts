import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { checkDigit, checkDigitHolds } from './check-digit';
import { barcodeUse, mayBeShared, readBarcode, unitInside } from './gtin';
import { compressUpcA, expandUpcE } from './upc-e';

const digits = (length: number) => fc.stringMatching(new RegExp(`^\\d{${length}}$`));
const whole = (length: number) => digits(length - 1).map((payload) => `${payload}${checkDigit(payload)}`);

describe('laws', () => {
	it('notices every single wrong digit', () => {
		fc.assert(
			fc.property(whole(13), fc.nat(12), fc.integer({ min: 1, max: 9 }), (code, at, by) => {
				const wrong = `${code.slice(0, at)}${(Number(code[at]) + by) % 10}${code.slice(at + 1)}`;
				expect(checkDigitHolds(code)).toBe(true);
				expect(checkDigitHolds(wrong)).toBe(false);
			})
		);
	});

	it('makes the 12-, 13- and 14-digit forms one product', () => {
		fc.assert(
			fc.property(whole(12), (code) => {
				fc.pre(!/^0+$/.test(code));
				expect(readBarcode(code)).toEqual(readBarcode(`0${code}`));
				expect(readBarcode(code)).toEqual(readBarcode(`00${code}`));
			})
		);
	});

	it('names the digit that would have been right', () => {
		fc.assert(
			fc.property(digits(12), fc.integer({ min: 1, max: 9 }), (payload, by) => {
				const right = checkDigit(payload);
				const read = readBarcode(`${payload}${(right + by) % 10}`);
				fc.pre(!/^0+$/.test(payload));
				expect(read.ok ? '' : read.reason).toContain(`should be ${right}.`);
			})
		);
	});

	it('expands what it compresses, and compresses what it expands to one spelling', () => {
		const spelled = fc.tuple(fc.constantFrom('0', '1'), digits(6)).map(([system, six]) => {
			const check = Array.from({ length: 10 }, (_, digit) => `${system}${six}${digit}`);
			return check.find((eight) => expandUpcE(eight) !== null) ?? '';
		});
		fc.assert(
			fc.property(spelled, (eight) => {
				const twelve = expandUpcE(eight) ?? '';
				const canonical = compressUpcA(twelve) ?? '';
				expect(checkDigitHolds(twelve)).toBe(true);
				expect(expandUpcE(canonical)).toBe(twelve);
				expect(compressUpcA(expandUpcE(canonical) ?? '')).toBe(canonical);
			})
		);
	});

	it('refuses a carton, naming a number that reads', () => {
		fc.assert(
			fc.property(fc.integer({ min: 1, max: 9 }), digits(12), (indicator, payload) => {
				fc.pre(!/^0+$/.test(payload));
				const carton = `${indicator}${payload}${checkDigit(`${indicator}${payload}`)}`;
				const read = readBarcode(carton);
				expect(read.ok ? '' : read.reason).toContain(unitInside(carton));
				expect(readBarcode(unitInside(carton)).ok).toBe(true);
			})
		);
	});

	it('shares no number that a shop or an example made up', () => {
		fc.assert(
			fc.property(fc.constantFrom('02', '04', '20', '25', '29', '952', '99'), digits(12), (prefix, rest) => {
				expect(mayBeShared(`${prefix}${rest}`.slice(0, 13))).toBe(false);
			})
		);
	});
});

describe('reading', () => {
	it.each([
		['9520000000110', '9520000000110', 'example'],
		['9 520000 000110', '9520000000110', 'example'],
		['9-520000-000110', '9520000000110', 'example'],
		['95200002', '0000095200002', 'example']
	])('%s', (typed, gtin, use) => {
		expect(readBarcode(typed)).toEqual({ ok: true, gtin, use });
	});

	it('lets the reader settle what eight digits are', () => {
		const typed = readBarcode('01234565');
		expect(typed).toMatchObject({ ok: false, either: ['0000001234565', '0012345000065'] });
		expect(readBarcode('01234565', 'ean-8')).toMatchObject({ gtin: '0000001234565', use: 'in-store' });
		expect(readBarcode('01234565', 'upc-e')).toMatchObject({ gtin: '0012345000065', use: 'product' });
	});

	it.each([
		['9520000000111', 'The last digit should be 0. Check the number, or scan it again.'],
		['95200001', 'The last digit should be 2. Check the number, or scan it again.'],
		['952000000011', 'The last digit should be 9. Check the number, or scan it again.'],
		['95200000001', 'A barcode has 8, 12, 13 or 14 digits. This one has 11.'],
		['952000000011O', 'Type the digits under the bars, and only those.'],
		['', 'Type the digits under the bars, and only those.'],
		['0000000000000', 'A barcode of nothing but zeros belongs to nothing.']
	])('refuses %s with a reason', (typed, reason) => {
		expect(readBarcode(typed)).toEqual({ ok: false, reason });
	});

	it('refuses a scanned UPC-E whose digits are none', () => {
		expect(readBarcode('22221111', 'upc-e').ok).toBe(false);
		expect(readBarcode('95200001', 'ean-8').ok).toBe(false);
	});
});

it('knows a prefix by the 13-digit form only', () => {
	expect(barcodeUse('0024543136538')).toBe('product');
	expect(barcodeUse('0206602301464')).toBe('in-store');
	expect(barcodeUse('9780000000002')).toBe('product');
});
