import { checkDigit } from '../../src/lib/domain/check-digit';
import type { SupplyDocument } from '../../src/lib/domain/exchange/supply-schema';
import type { Print } from '../patterns/paint';

/** A supply of the demonstration room, and for paper the print that its picture shows. */
export interface Row {
	readonly supply: SupplyDocument;
	readonly print?: Print;
}

export type SheetDocument = Extract<SupplyDocument, { sheets: number }>;
export type Faces = NonNullable<SheetDocument['faces']>;

/** The nth made-up product's barcode: GS1 keeps the prefix 952 for examples. */
export function barcode(nth: number): string {
	const payload = `952000${String(nth).padStart(6, '0')}`;
	return `${payload}${checkDigit(payload)}`;
}

export const dollars = (cents: number) => ({ amount: cents, currency: 'USD' });

/** The date so many days after another, as YYYY-MM-DD. */
export const daysAfter = (today: string, days: number) =>
	new Date(Date.parse(today) + days * 86_400_000).toISOString().slice(0, 10);
