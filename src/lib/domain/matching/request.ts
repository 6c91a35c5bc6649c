import type { Bill } from '../bill/bill';
import type { Supply } from '../stash';
import type { MatchOptions } from './verdict';

export type MatchMode = 'each' | 'queue';

export interface MatchRequest {
	readonly bills: readonly Bill[];
	/** In the stash's order, which breaks ties. */
	readonly supplies: readonly Supply[];
	readonly mode: MatchMode;
	/** How many of a project, by its key; one where it isn't named. */
	readonly copies: Readonly<Record<string, number>>;
	/** The making date, YYYY-MM-DD. */
	readonly on: string;
	readonly options: MatchOptions;
}

/** Work is shared out over the projects; equal work gives equal answers. */
export interface MatchBudget {
	readonly work: number;
	readonly shouldStop?: () => boolean;
}

export const DEFAULT_OPTIONS: MatchOptions = {
	units: 'in',
	kerf: 0,
	reach: null,
	knife: false,
	keepOffcut: null
};
