import type { LengthUnit } from '$lib/domain/length';

/** The unit that a measure was entered in, so that it is shown as the label says it; undefined for the room's. */
export function enteredUnit(
	{ unit, entered }: { unit: string | null; entered: Readonly<Record<string, string>> | null },
	field: string
): LengthUnit | undefined {
	const noted = entered?.[field] ?? unit;
	return noted === 'in' || noted === 'mm' || noted === 'cm' ? noted : undefined;
}
