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
	const digits = `952000${String(nth).padStart(6, '0')}`;
	const sum = [...digits].reduce((total, digit, i) => total + Number(digit) * (i % 2 === 0 ? 1 : 3), 0);
	return `${digits}${(10 - (sum % 10)) % 10}`;
}

export const dollars = (cents: number) => ({ amount: cents, currency: 'USD' });

/** The date so many days after another, as YYYY-MM-DD. */
export const daysAfter = (today: string, days: number) =>
	new Date(Date.parse(today) + days * 86_400_000).toISOString().slice(0, 10);
