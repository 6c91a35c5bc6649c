import type { CutBudget } from '../cutting/problem';
import type { MatchBudget } from './request';

/**
 * The work that one project may spend. A planner's call gets a share of what is left; a call that ends with a
 * proof is charged for the size of its question, one that doesn't for its whole share.
 */
export interface Purse {
	left: number;
	readonly shouldStop: (() => boolean) | undefined;
}

export function purseOf(budget: MatchBudget, projects: number): Purse {
	return { left: Math.floor(budget.work / Math.max(1, projects)), shouldStop: budget.shouldStop };
}

export function isSpent(purse: Purse): boolean {
	return purse.left <= 0 || purse.shouldStop?.() === true;
}

export function shareOf(purse: Purse): CutBudget {
	const work = Math.ceil(purse.left / 4);
	return purse.shouldStop ? { work, shouldStop: purse.shouldStop } : { work };
}
