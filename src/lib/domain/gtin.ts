import { expandUpcE } from './upc-e';
import { checkDigit, checkDigitHolds } from './check-digit';

/** What the reader says it saw; only it can tell a UPC-E from a GTIN-8. */
export type Symbology = 'ean-8' | 'upc-e';
/** `reserved` covers what GS1 has not given out, kept for itself, or given out only as eight digits. */
export type BarcodeUse = 'product' | 'in-store' | 'example' | 'coupon' | 'reserved';
export type BarcodeRead =
	| { readonly ok: true; readonly gtin: string; readonly use: BarcodeUse }
	| {
			readonly ok: false;
			readonly reason: string;
			/** The two products that eight digits may mean, as 13 digits: for the user to choose from. */
			readonly either?: readonly [string, string];
	  };

/**
 * One product, one number: any of its forms as 13 digits, zeros in front. Takes the gaps and hyphens that are
 * printed between digits. A wrong check digit is refused with the digit that it should be, a carton's number with
 * the number of the pack inside.
 */
export function readBarcode(text: string, symbology?: Symbology): BarcodeRead {
	const digits = text.trim().replace(/(?<=\d)[ \u00a0-](?=\d)/g, '');
	if (!/^\d+$/.test(digits)) return refuse('Type the digits under the bars, and only those.');
	if (/^0+$/.test(digits)) return refuse('A barcode of nothing but zeros belongs to nothing.');
	if (digits.length === 8) return readEight(digits, symbology);
	if (![12, 13, 14].includes(digits.length)) {
		return refuse(`A barcode has 8, 12, 13 or 14 digits. This one has ${digits.length}.`);
	}
	if (!checkDigitHolds(digits)) return refuse(wrongDigit(digits.slice(0, -1)));
	if (digits.length === 14 && digits[0] !== '0') {
		return refuse(`That number is a carton’s. The pack inside has ${unitInside(digits)}.`);
	}
	return accept(digits.slice(-13).padStart(13, '0'));
}

/** May a record under this 13-digit number be shown to other rooms? Numbers that shops make up never are. */
export function mayBeShared(gtin: string): boolean {
	return barcodeUse(gtin) === 'product';
}

/** By the GS1 prefix of the 13-digit form; five zeros in front make it a GTIN-8, which has prefixes of its own. */
export function barcodeUse(gtin: string): BarcodeUse {
	const eight = gtin.startsWith('00000');
	const prefix = Number(eight ? gtin.slice(5, 8) : gtin.slice(0, 3));
	const ranges = eight ? EIGHT_DIGIT_PREFIXES : PREFIXES;
	return ranges.find(([first, last]) => prefix >= first && prefix <= last)?.[2] ?? 'product';
}

/** The 13-digit number of what a carton holds: without its indicator, with a check digit of its own. */
export function unitInside(carton: string): string {
	const payload = carton.slice(1, 13);
	return `${payload}${checkDigit(payload)}`;
}

function readEight(digits: string, symbology: Symbology | undefined): BarcodeRead {
	const asEight = checkDigitHolds(digits) ? digits.padStart(13, '0') : null;
	const expanded = expandUpcE(digits);
	const asUpcE = expanded === null ? null : expanded.padStart(13, '0');
	if (symbology === 'ean-8') return asEight ? accept(asEight) : refuse(wrongDigit(digits.slice(0, 7)));
	if (symbology === 'upc-e') {
		return asUpcE
			? accept(asUpcE)
			: refuse('Those eight digits aren’t a short barcode. Scan it again, or type all twelve.');
	}
	if (asEight && asUpcE) {
		const reason = 'Eight digits can stand for two products. Scan it, or say which of the two it is.';
		return { ok: false, reason, either: [asEight, asUpcE] };
	}
	const gtin = asEight ?? asUpcE;
	return gtin === null ? refuse(wrongDigit(digits.slice(0, 7))) : accept(gtin);
}

function accept(gtin: string): BarcodeRead {
	return { ok: true, gtin, use: barcodeUse(gtin) };
}

function wrongDigit(payload: string): string {
	return `The last digit should be ${checkDigit(payload)}. Check the number, or scan it again.`;
}

function refuse(reason: string): BarcodeRead {
	return { ok: false, reason };
}

type Range = readonly [first: number, last: number, use: BarcodeUse];

/** GS1 General Specifications, figure 1.4.2-1; what is not named is a product's. */
const PREFIXES: readonly Range[] = [
	[20, 29, 'in-store'],
	[40, 49, 'in-store'],
	[50, 59, 'reserved'],
	[140, 199, 'reserved'],
	[200, 299, 'in-store'],
	[950, 951, 'reserved'],
	[952, 952, 'example'],
	[960, 969, 'reserved'],
	[980, 984, 'coupon'],
	[985, 989, 'reserved'],
	[990, 999, 'coupon']
];
/** GS1 General Specifications, figure 1.4.3-1. */
const EIGHT_DIGIT_PREFIXES: readonly Range[] = [
	[0, 99, 'in-store'],
	[200, 299, 'in-store'],
	[952, 952, 'example'],
	[977, 999, 'reserved']
];
