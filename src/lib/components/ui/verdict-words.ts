import type { Verdict } from '$lib/domain/matching/verdict';

export const VERDICT_WORDS: Readonly<Record<Verdict, string>> = {
	now: 'Make it now',
	swap: 'Make it with a swap',
	after: 'After…',
	look: 'Look first',
	short: 'Short'
};

/** `After 12 March`, where the date is known. `on` is YYYY-MM-DD. */
export function verdictWords(verdict: Verdict, on: string | null = null): string {
	if (verdict !== 'after' || !on) return VERDICT_WORDS[verdict];
	return `After ${dayOf(on)}`;
}

/** A date as it is said: `12 March`, and with its year where that isn't this one. */
export function dayOf(on: string): string {
	const year = on.startsWith(String(new Date().getUTCFullYear())) ? undefined : 'numeric';
	return new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'long', year, timeZone: 'UTC' }).format(
		new Date(`${on}T00:00:00Z`)
	);
}
