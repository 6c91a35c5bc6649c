import type { BillDocument, SupplyDocument } from '../domain/exchange';

/** A project that ships with the product, for a first try. */
export interface Starter {
	readonly key: string;
	/** One sentence: what it is, and what it asks for. */
	readonly says: string;
	readonly bill: BillDocument;
	/** Tools and glue that a first try takes as owned; only paper is asked after. */
	readonly kit: readonly SupplyDocument[];
}
