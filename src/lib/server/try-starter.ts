import type { SupplyDocument } from '../domain/exchange';
import type { ProjectResult } from '../domain/matching/verdict';
import type { Try, TryRow } from '../schemas/try';
import { STARTERS } from '../starter';
import { answered } from './answered';
import { today } from './clock';
import { matcher } from './matcher';

const BUDGET_MS = 1500;
/** Something to see on the drawing: no two of a visitor's papers look alike. */
const COLOURS = [
	['#d9b27c', '#b98b5e'],
	['#7fa39a', '#f3ead8'],
	['#c98f86', '#fbf6ea']
];

/** What a starter project can be made of, from a visitor's own papers and the kit that it takes as owned. */
export async function tryStarter({ project, units, papers }: Try) {
	const starter = STARTERS.find(({ key }) => key === project)!;
	const sheets = papers.flatMap((paper, index) => (paper.size === '' ? [] : [supplyOf(paper, index)]));
	const request = {
		projects: [starter.bill],
		supplies: [...sheets, ...starter.kit],
		budgetMs: BUDGET_MS,
		options: { units }
	};
	const { response } = answered(await matcher.ask({ request, today: today() }, BUDGET_MS));
	return { bill: starter.bill, kit: starter.kit, sheets, result: response.results[0] as ProjectResult };
}

function supplyOf({ kind, size, sheets, direction }: TryRow, index: number) {
	const name = `Your ${['first', 'second', 'third'][index]} paper`;
	return {
		key: `paper-${index + 1}`,
		kind,
		name,
		size,
		sheets,
		faces: [{ design: name, direction }],
		colours: COLOURS[index % COLOURS.length]
	} satisfies SupplyDocument;
}
