import type { ToolSupply } from '../stash';
import { toolDates, toolOn, type Demand, type ToolChoice } from './tools';
import type { LineResult, Verdict } from './verdict';

/**
 * A tool's line by itself: on the day, else from the first day on which it is met, no later than `until`. What a
 * tool doesn't state comes after a wait and before a purchase.
 */
export function toolLine(
	demand: Demand,
	tools: readonly ToolSupply[],
	on: string,
	until: string | null
): LineResult {
	const days = [on, ...toolDates(tools, on).filter((day) => until === null || day <= until)];
	const choices = days.map((day) => ({ day, choice: toolOn(demand, tools, day) }));
	const best =
		choices.find(({ choice }) => choice && choice.unsaid === null) ?? choices.find(({ choice }) => choice);
	return best?.choice ? metLine(demand, best.choice, best.day, on) : unmetLine(demand);
}

/** The same line on a day that the rest of the project sets, where another tool may have to serve. */
export function toolLineOn(
	alone: LineResult,
	demand: Demand,
	tools: readonly ToolSupply[],
	day: string,
	today: string
): LineResult {
	const choice = toolOn(demand, tools, day);
	if (!choice) return unmetLine(demand);
	return alone.supplies?.includes(choice.tool.key) ? alone : metLine(demand, choice, day, today);
}

function metLine(
	{ line }: Demand,
	{ tool, swap, unsaid }: ToolChoice,
	day: string,
	today: string
): LineResult {
	const later = [tool.lentUntil, tool.arrives].some((date) => date !== null && date > today);
	const verdict: Verdict = unsaid !== null ? 'look' : later ? 'after' : swap !== null ? 'swap' : 'now';
	return {
		line,
		verdict,
		supplies: [tool.key],
		swap,
		...(later ? { after: day } : {}),
		...(unsaid !== null ? { why: `its ${unsaid} isn't stated` } : {})
	};
}

function unmetLine({ line }: Demand): LineResult {
	return { line, verdict: 'short', supplies: [], swap: null };
}
