import { FAMILIES, kindWords, type Group } from '$lib/components/supply/kinds';
import type { Option, Options } from '$lib/components/ui/options';

export const EDGES: readonly Option[] = [
	{ value: 'left', label: 'Left' },
	{ value: 'right', label: 'Right' },
	{ value: 'top', label: 'Top' },
	{ value: 'bottom', label: 'Bottom' }
];

export const CORNERS: readonly Option[] = [
	{ value: 'top-left', label: 'Top left' },
	{ value: 'top-right', label: 'Top right' },
	{ value: 'bottom-left', label: 'Bottom left' },
	{ value: 'bottom-right', label: 'Bottom right' }
];

/** Kinds of a group, by the drawer they lie in. */
export const kindsOf = (group: Group): Options =>
	FAMILIES.filter((family) => family.group === group).map(({ label, kinds }) => ({
		label,
		options: kinds.map((kind) => ({ value: kind, label: kindWords(kind) }))
	}));
