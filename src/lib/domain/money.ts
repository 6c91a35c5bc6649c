/** Whole minor units of an ISO 4217 currency. */
export interface Money {
	readonly amount: number;
	readonly currency: string;
}
