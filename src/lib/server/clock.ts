/** The day it is in UTC, YYYY-MM-DD: now, or at an instant in ms. */
export function today(at = Date.now()): string {
	return new Date(at).toISOString().slice(0, 10);
}
