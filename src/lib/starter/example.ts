import type { SupplyDocument } from '../domain/exchange';
import { STARTERS } from '.';

/** A drawer of invented papers: what the start page works its picture out from. */
const PAPERS: readonly SupplyDocument[] = [
	{
		key: 'oat',
		kind: 'cardstock',
		name: 'Oat card',
		size: '8 1/2 x 11 in',
		sheets: 3,
		colours: ['#e6d2a9', '#d7bf90']
	},
	{
		key: 'fern',
		kind: 'patterned-paper',
		name: 'Fern Lattice',
		size: '12 x 12 in',
		sheets: 1,
		faces: [
			{ design: 'Fern Lattice', direction: 'one-way' },
			{ design: 'Oat Stripe', direction: 'two-way' }
		],
		colours: ['#6d8a5f', '#e9e0c4']
	}
];

/** Everybody's kit, save that nobody counted the glue dots and there is no corner punch. */
const KIT = new Map(
	STARTERS.flatMap(({ kit }) => kit)
		.filter(({ kind }) => kind !== 'corner-punch')
		.map((supply) => [
			supply.key,
			supply.kind === 'glue-dots' ? { ...supply, count: 'unsure' as const } : supply
		])
);

export const EXAMPLE_PAPERS = PAPERS;
export const EXAMPLE_STASH: readonly SupplyDocument[] = [...PAPERS, ...KIT.values()];
