import { freeKey, type Finding, type Proof } from './finding';

const LISTS = ['slots', 'pieces', 'adhesives', 'tools', 'extras'] as const;

/** Lines that can't be told apart. */
export function keyFindings({ bill }: Proof): Finding[] {
	return LISTS.flatMap((list) => {
		const seen = new Set<string>();
		return bill[list].flatMap(({ key }, index): Finding[] => {
			const again = seen.has(key);
			seen.add(key);
			if (!again) return [];
			const free = freeKey(key, bill[list]);
			return [
				{
					line: `${list}/${key}`,
					rule: 'key-twice',
					severity: 'mend',
					message: `Two lines of this list are called “${key}”.`,
					mend: {
						text: `Call the second one “${free}”.`,
						change: { path: `${list}.${index}.key`, value: free }
					}
				}
			];
		});
	});
}

/** Measures that nothing is made from. */
export function measureFindings({ bill }: Proof): Finding[] {
	return (bill.unusedMeasures ?? []).map((name) => ({
		line: `measures/${name}`,
		rule: 'measure-unused',
		severity: 'ask',
		message: `No formula uses the measure “${name}”, so changing it changes nothing.`,
		mend: { text: `Use it in a piece, as “=${name}”, or take it out.` }
	}));
}
