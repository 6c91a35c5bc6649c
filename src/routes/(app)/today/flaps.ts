import type { Flap } from '$lib/components/project/flap';
import { edgeWords } from '$lib/components/project/words';
import type { BillDocument } from '$lib/domain/exchange';
import { VERDICTS, type ProjectResult } from '$lib/domain/matching/verdict';

export interface TodayFlap extends Flap {
	readonly id: string;
	/** Short only because of the projects before it. */
	readonly nowIfFirst: boolean;
}

interface Ranked {
	readonly mode: 'each' | 'queue';
	readonly rows: readonly {
		readonly project: {
			readonly id: string;
			readonly key: string;
			readonly name: string;
			readonly bill: BillDocument;
		};
		readonly result: ProjectResult;
	}[];
}

/** Each on its own: the best first. In order: as the queue stands, since that is what decides. */
export function flapsOf({ mode, rows }: Ranked): TodayFlap[] {
	const flaps = rows.map(({ project, result }) => ({
		id: project.id,
		key: project.key,
		name: project.name,
		verdict: result.verdict,
		after: result.after,
		nowIfFirst: result.nowIfFirst,
		says: edgeWords(project.bill, result)
	}));
	if (mode === 'queue') return flaps;
	return flaps.sort((a, b) => VERDICTS.indexOf(a.verdict) - VERDICTS.indexOf(b.verdict));
}
