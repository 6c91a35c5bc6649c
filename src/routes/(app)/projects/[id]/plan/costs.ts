import type { ProjectResult } from '$lib/domain/matching/verdict';

interface Other {
	readonly project: { readonly id: string; readonly name: string };
	readonly result: ProjectResult;
}

/** Another project whose own plan no longer finds its sheets once this one is cut. */
export interface Loss {
	readonly id: string;
	readonly name: string;
	/** The supplies, by key, that don't hold enough for both. */
	readonly supplies: readonly string[];
}

/**
 * What cutting a plan costs the projects that can be made now, each alone. A sheet goes with both its faces.
 * @param owned sheets by the supply's key
 */
export function costsOf(
	{ plan }: ProjectResult,
	others: readonly Other[],
	owned: ReadonlyMap<string, number>
): Loss[] {
	const cut = opened(plan);
	return others.flatMap(({ project: { id, name }, result }) => {
		if (result.verdict === 'short') return [];
		const lacking = [...opened(result.plan)].filter(
			([supply, wanted]) => cut.has(supply) && wanted + cut.get(supply)! > (owned.get(supply) ?? 0)
		);
		return lacking.length > 0 ? [{ id, name, supplies: lacking.map(([supply]) => supply) }] : [];
	});
}

function opened(plan: ProjectResult['plan']): Map<string, number> {
	const sheets = new Map<string, number>();
	for (const { supply } of plan?.sheets ?? []) sheets.set(supply, (sheets.get(supply) ?? 0) + 1);
	return sheets;
}
