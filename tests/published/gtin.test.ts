import { describe, expect, it } from 'vitest';
import { checkDigit, checkDigitHolds } from '../../src/lib/domain/check-digit';
import { barcodeUse, mayBeShared, readBarcode, unitInside } from '../../src/lib/domain/gtin';
import { compressUpcA, expandUpcE } from '../../src/lib/domain/upc-e';

function gtin(typed: string, symbology?: Parameters<typeof readBarcode>[1]): string {
	const read = readBarcode(typed, symbology);
	if (!read.ok) throw new Error(read.reason);
	return read.gtin;
}

describe('check digits', () => {
	// GS1 Barcode Syntax Dictionary, reference linter "csum", unit tests (src/lint_csum.c @ff2eb4bf)
	it.each([
		['02345673', true],
		['12345673', false],
		['416000336108', true],
		['416000336109', false],
		['1234567890128', true],
		['1234567890129', false],
		['12345678901231', true],
		['12345678901232', false],
		['123456789012345675', true],
		['123456789012345670', false]
	])('%s: %s', (code, valid) => {
		expect(checkDigitHolds(code)).toBe(valid);
	});

	it.each([
		['12345673', 0],
		['416000336109', 8],
		['1234567890129', 8],
		['12345678901232', 1],
		['123456789012345670', 5]
	])('%s should end in %i', (code, right) => {
		expect(checkDigit(code.slice(0, -1))).toBe(right);
		if (code.length < 18)
			expect(readBarcode(code)).toMatchObject({
				ok: false,
				reason: expect.stringContaining(`should be ${right}.`)
			});
	});

	// The same unit tests: too short, or not digits only
	it.each(['', ' 23456789012345675', '12345678 012345675', '12345678901234567 '])(
		'“%s” holds none',
		(code) => {
			expect(checkDigitHolds(code)).toBe(false);
		}
	);

	// GS1 Barcode Syntax Engine, scan-data tests (src/c-lib/scandata.c @50657dbd); a price-comparison feed's gtin field
	it.each([
		['2112345678900', true],
		['2112345678901', false],
		['90311017', true],
		['10614141000415', true]
	])('%s: %s', (code, valid) => {
		expect(checkDigitHolds(code)).toBe(valid);
	});

	// GS1 Hong Kong, check digit calculator: weighted sum 57
	it('629104150021 takes 3', () => {
		expect(checkDigit('629104150021')).toBe(3);
		expect(gtin('6291041500213')).toBe('6291041500213');
	});
});

describe('one number for each product', () => {
	// GS1 lint_csum.c (the carton); its unit is a code of the BWIPP ean13 tests
	it('finds 2345678901234 in the carton 12345678901231, and takes no carton for its unit', () => {
		expect(unitInside('12345678901231')).toBe('2345678901234');
		expect(readBarcode('12345678901231')).toEqual({
			ok: false,
			reason: 'That number is a carton’s. The pack inside has 2345678901234.'
		});
	});

	// GS1 Barcode Syntax Engine, scandata.c
	it('pads 02345673 and 416000336108', () => {
		expect(gtin('02345673', 'ean-8')).toBe('0000002345673');
		expect(gtin('416000336108')).toBe('0416000336108');
		expect(gtin('00416000336108')).toBe('0416000336108');
	});
});

// gtin-validator test suite, after GS1 General Specifications v18 (tests/Gtin*Test.php @357b4923).
// Spaces and hyphens that it refuses are taken here as a typed number's gaps, so those are held against the check digit alone;
// a code that is too short or long for one form may be another form's, so those are held against the check digit or the length.
describe('codes for a public catalogue', () => {
	it.each([
		['87340679'],
		['96134535'],
		['018466468845'],
		['000906332847'],
		['5038538074830'],
		['0000906332847']
	])('%s may be shared', (code) => {
		expect(mayBeShared(gtin(code, code.length === 8 ? 'ean-8' : undefined))).toBe(true);
	});

	it.each([['45038538074838'], ['30000906332848']])(
		'%s is a good carton, whose unit may be shared',
		(code) => {
			expect(checkDigitHolds(code)).toBe(true);
			expect(readBarcode(code).ok).toBe(false);
			expect(mayBeShared(gtin(unitInside(code)))).toBe(true);
		}
	);

	it.each([
		['00000000', 'all zeros'],
		['87340670', 'check digit'],
		['000000000000', 'all zeros'],
		['018466468841', 'check digit'],
		['0000000000000', 'all zeros'],
		['5038538074833', 'check digit'],
		['00000000000000', 'all zeros'],
		['45038538074830', 'check digit']
	])('%s is refused: %s', (code) => {
		expect(readBarcode(code).ok).toBe(false);
	});

	it.each([
		['8 7340679', 'not only digits'],
		['8-734-0679', 'not only digits'],
		['0 00906332847', 'not only digits']
	])('%s is no code as it stands: %s', (code) => {
		expect(checkDigitHolds(code)).toBe(false);
	});

	it.each([
		['20334536', 'ean-8'],
		['9668538074835', undefined]
	] as const)('%s may not be shared, for its prefix', (code, symbology) => {
		const read = readBarcode(code, symbology);
		expect(read.ok && mayBeShared(read.gtin)).toBe(false);
	});
});

describe('UPC-E', () => {
	// A line-matrix printer's programmer manual, UPC-E six-digit examples
	it.each([
		['124560', '012000004568'],
		['275831', '027100005834'],
		['412022', '041200002029'],
		['876543', '087600000548'],
		['753774', '075370000073'],
		['213756', '021375000068'],
		['517019', '051701000097'],
		['593663', '059300000661']
	])('0 %s stands for %s', (six, upcA) => {
		expect(expandUpcE(`0${six}${upcA[11]}`)).toBe(upcA);
	});

	// BWIPP writer tests; zxing-cpp sample pictures and GTINTest.cpp @77dceca0
	it.each([
		['03084009', '030000008409', '0030000008409'],
		['01234565', '012345000065', '0012345000065'],
		['00123457', '001234000057', '0001234000057'],
		['05096893', '050968000093', '0050968000093'],
		['12345670', '123456000070', '0123456000070']
	])('%s stands for %s', (eight, upcA, thirteen) => {
		expect(expandUpcE(eight)).toBe(upcA);
		expect(gtin(eight, 'upc-e')).toBe(thirteen);
	});

	// BWIPP writer tests (upce.ps.test @b22ce8fe): the check digit is 9
	it('03084000 is none', () => {
		expect(expandUpcE('03084000')).toBeNull();
		expect(readBarcode('03084000', 'upc-e').ok).toBe(false);
	});

	// zxing-cpp GTINTest.cpp: there is no number system 2
	it('22221111 is none, nor a GTIN-8', () => {
		expect(expandUpcE('22221111')).toBeNull();
		expect(readBarcode('22221111').ok).toBe(false);
	});

	// BWIPP writer tests (upce.ps.test @b22ce8fe)
	it.each([
		['012100003454', '01234514'],
		['112100003451', '11234511'],
		['098200007653', '09876523'],
		['098700000659', '09876539'],
		['098760000057', '09876547'],
		['098765000076', '09876576']
	])('%s shortens to %s', (upcA, eight) => {
		expect(compressUpcA(upcA)).toBe(eight);
		expect(expandUpcE(eight)).toBe(upcA);
	});

	it('098760000057 has two spellings, of which one is canonical', () => {
		expect(expandUpcE('09876057')).toBe('098760000057');
		expect(expandUpcE('09876547')).toBe('098760000057');
	});

	it.each(['012345678905', '21210000345'])('%s does not shorten', (upcA) => {
		expect(compressUpcA(upcA)).toBeNull();
	});
});

// Computed from the two rules: the reader's symbology decides, never the digits
describe('eight digits', () => {
	it.each([
		['12345670', true, '123456000070'],
		['01234565', true, '012345000065'],
		['00123457', true, '001234000057'],
		['03084009', false, '030000008409'],
		['05096893', true, '050968000093'],
		['02345673', true, '023456000073']
	])('%s as GTIN-8: %s; as UPC-E: %s', (code, asEight, upcA) => {
		expect(readBarcode(code, 'ean-8').ok).toBe(asEight);
		expect(gtin(code, 'upc-e')).toBe(`0${upcA}`);
		expect(readBarcode(code).ok).toBe(!asEight);
	});

	// By algebra: where the sixth digit is 5 to 9 the two check digits are one sum, so 580,000 of 1,000,000 are both
	it('are both in 58 of 100, over every hundredth code of number system 0', () => {
		let both = 0;
		for (let six = 0; six < 1_000_000; six += 101) {
			const body = `0${String(six).padStart(6, '0')}`;
			const eights = Array.from({ length: 10 }, (_, digit) => `${body}${digit}`);
			if (eights.some((eight) => expandUpcE(eight) !== null && checkDigitHolds(eight))) both += 1;
		}
		expect(Math.abs(both / Math.ceil(1_000_000 / 101) - 0.58)).toBeLessThan(0.01);
	});
});

// zxing-cpp GTINTest.cpp @77dceca0 (GS1 company prefixes as of 7 February 2022; GTIN-8: General Specifications, figure 1.4.3-1)
describe('numbers that must not be shared', () => {
	it.each([
		['0206602301464', false],
		['0296602301465', false],
		['0406602301468', false],
		['0496602301469', false],
		['0506602301465', false],
		['1406602301467', false],
		['2006602301468', false],
		['2996602301462', false],
		['0000000001465', false],
		['0306602301461', true],
		['0606602301462', true],
		['0016602301469', true],
		['1006602301469', true],
		['206602301464', false],
		['296602301465', false],
		['406602301468', false],
		['036602301467', true],
		['012546619592', true]
	])('%s shared: %s', (code, shared) => {
		expect(mayBeShared(gtin(code))).toBe(shared);
	});

	it.each([
		['20045678', false],
		['00045674', false],
		['09945678', false],
		['10045671', true],
		['30045675', true],
		['97745679', false]
	])('GTIN-8 %s shared: %s', (code, shared) => {
		expect(mayBeShared(gtin(code, 'ean-8'))).toBe(shared);
	});

	it.each([
		['12345678901231', false],
		['13005678901233', true]
	])('the unit of the carton %s shared: %s', (code, shared) => {
		expect(mayBeShared(gtin(unitInside(code)))).toBe(shared);
	});

	it('0000001991469 has a wrong check digit besides', () => {
		expect(readBarcode('0000001991469').ok).toBe(false);
	});

	// A GTIN-12 that starts 02 is prefix 002 once padded; only one that starts 2 or 4 is 02x or 04x
	it('024543136538 is prefix 002, and a product', () => {
		expect(gtin('024543136538')).toBe('0024543136538');
		expect(mayBeShared('0024543136538')).toBe(true);
	});
});

// gtin-validator prefix table (GS1 General Specifications, figures 1.4.2-1 and 1.4.3-1; list checked 2 January 2026)
describe('prefixes', () => {
	it.each([
		['0000000', 'in-store'],
		['0001000', 'product'],
		['019', 'product'],
		['020', 'in-store'],
		['029', 'in-store'],
		['030', 'product'],
		['039', 'product'],
		['040', 'in-store'],
		['049', 'in-store'],
		['050', 'reserved'],
		['059', 'reserved'],
		['060', 'product'],
		['139', 'product'],
		['140', 'reserved'],
		['199', 'reserved'],
		['200', 'in-store'],
		['299', 'in-store'],
		['300', 'product'],
		['950', 'reserved'],
		['951', 'reserved'],
		['952', 'example'],
		['960', 'reserved'],
		['969', 'reserved'],
		['978', 'product'],
		['979', 'product'],
		['980', 'coupon'],
		['981', 'coupon'],
		['984', 'coupon'],
		['990', 'coupon'],
		['999', 'coupon']
	])('%s is %s', (prefix, use) => {
		expect(barcodeUse(prefix.padEnd(13, '5'))).toBe(use);
	});

	it.each([
		['000', 'in-store'],
		['099', 'in-store'],
		['100', 'product'],
		['199', 'product'],
		['200', 'in-store'],
		['299', 'in-store'],
		['300', 'product'],
		['951', 'product'],
		['952', 'example'],
		['953', 'product'],
		['976', 'product'],
		['977', 'reserved'],
		['999', 'reserved']
	])('GTIN-8 %s is %s', (prefix, use) => {
		expect(barcodeUse(`00000${prefix}55555`)).toBe(use);
	});
});
