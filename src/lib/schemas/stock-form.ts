/**
 * A typed amount as the services take it: a whole number for what is counted, and the text itself for a length or
 * a volume, which has its unit in it or takes the room's.
 */
export function amountTyped(text: string, measure: 'length' | 'volume' | 'count'): number | string {
	const typed = text.trim();
	return measure === 'count' && /^\d{1,9}$/.test(typed) ? Number(typed) : typed;
}
