import { parseLength, parseSize, type Length, type LengthEntry, type LengthUnit } from '$lib/domain/length';

/** What a typed length or size was understood as, side by side. */
export type Reading =
	| { readonly ok: true; readonly sides: readonly Length[]; readonly unit: LengthUnit }
	| { readonly ok: false; readonly reason: string }
	| null;

export function readTyped(text: string, pair: boolean, entry: LengthEntry): Reading {
	if (text.trim() === '') return null;
	if (pair) {
		const size = parseSize(text, entry);
		return size.ok ? { ok: true, sides: [size.w, size.h], unit: size.unit } : size;
	}
	const length = parseLength(text, entry);
	return length.ok ? { ok: true, sides: [length.value], unit: length.unit } : length;
}
