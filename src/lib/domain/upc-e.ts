import { checkDigit, checkDigitHolds } from './check-digit';

/**
 * The 12 digits that a UPC-E's eight stand for (number system 0 or 1, six digits, the check digit of the twelve);
 * null where they aren't one. Zeros are put back where the sixth digit says that they were left out.
 */
export function expandUpcE(eight: string): string | null {
	if (!/^[01]\d{7}$/.test(eight)) return null;
	const six = eight.slice(1, 7);
	const last = Number(six[5]);
	const payload = eight[0] + withZeros(six, last);
	return checkDigit(payload) === Number(eight[7]) ? payload + eight[7] : null;
}

/** The one canonical UPC-E of a valid UPC-A, or null where its zeros don't lie right. */
export function compressUpcA(twelve: string): string | null {
	if (!/^[01]\d{11}$/.test(twelve) || !checkDigitHolds(twelve)) return null;
	const maker = twelve.slice(1, 6);
	const item = twelve.slice(6, 11);
	const six = leaveOut(maker, item);
	return six === null ? null : `${twelve[0]}${six}${twelve[11]}`;
}

function withZeros(six: string, last: number): string {
	if (last <= 2) return `${six.slice(0, 2)}${last}0000${six.slice(2, 5)}`;
	if (last === 3) return `${six.slice(0, 3)}00000${six.slice(3, 5)}`;
	if (last === 4) return `${six.slice(0, 4)}00000${six[4]}`;
	return `${six.slice(0, 5)}0000${last}`;
}

/** In the order of the rules, so that a UPC-A with two spellings always gets the same. */
function leaveOut(maker: string, item: string): string | null {
	if (/^..[012]00$/.test(maker) && item.startsWith('00'))
		return `${maker.slice(0, 2)}${item.slice(2)}${maker[2]}`;
	if (maker.endsWith('00') && item.startsWith('000')) return `${maker.slice(0, 3)}${item.slice(3)}3`;
	if (maker.endsWith('0') && item.startsWith('0000')) return `${maker.slice(0, 4)}${item[4]}4`;
	if (item.startsWith('0000') && Number(item[4]) >= 5) return `${maker}${item[4]}`;
	return null;
}
