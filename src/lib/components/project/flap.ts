import type { Verdict } from '$lib/domain/matching/verdict';

/** What the visible edge of a project's flap says. */
export interface Flap {
	readonly key: string;
	readonly name: string;
	readonly verdict: Verdict;
	/** The date of `after`, YYYY-MM-DD. */
	readonly after: string | null;
	/** One line: what it takes, or what it lacks. */
	readonly says: string;
}
