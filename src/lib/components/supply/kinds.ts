import { SHEET_KINDS, SUPPLY_MEASURES, TOOL_KINDS } from '$lib/domain/stash';
import type { ConsumableKind, SupplyKind } from '$lib/domain/stash';

export type Group = 'sheet' | 'consumable' | 'tool';
type Measure = 'length' | 'volume' | 'count';
export type FamilyKey =
	| ('paper' | 'fancy' | 'board' | 'tape' | 'glue' | 'fasten' | 'trim')
	| ('cut' | 'measure' | 'score' | 'punch' | 'die' | 'finish');

/** Kinds that lie together in a drawer, so that one is found without knowing its name. */
interface Family {
	readonly key: FamilyKey;
	readonly label: string;
	readonly group: Group;
	readonly kinds: readonly SupplyKind[];
}

export const GROUP_WORDS: Readonly<Record<Group, string>> = {
	sheet: 'Paper and sheets',
	consumable: 'Tape, glue and trimmings',
	tool: 'Tools'
};

export const FAMILIES: readonly Family[] = [
	{
		key: 'paper',
		label: 'Paper and card',
		group: 'sheet',
		kinds: ['patterned-paper', 'cardstock', 'plain-paper', 'kraft-paper', 'watercolour-paper']
	},
	{
		key: 'fancy',
		label: 'Papers with an effect',
		group: 'sheet',
		kinds: ['vellum', 'mulberry-paper', 'metallic-paper', 'glitter-paper', 'acetate']
	},
	{
		key: 'board',
		label: 'Board, cloth and other sheets',
		group: 'sheet',
		kinds: ['chipboard', 'book-cloth', 'felt', 'magnet-sheet', 'adhesive-sheet']
	},
	{
		key: 'tape',
		label: 'Tape and runner',
		group: 'consumable',
		kinds: ['tape', 'foam-tape', 'washi-tape', 'runner']
	},
	{
		key: 'glue',
		label: 'Glue, dots and ink',
		group: 'consumable',
		kinds: ['glue', 'glue-stick', 'spray-adhesive', 'glue-dots', 'foam-squares', 'ink']
	},
	{
		key: 'fasten',
		label: 'Fastenings',
		group: 'consumable',
		kinds: ['magnets', 'brads', 'eyelets', 'rings', 'closures', 'elastic']
	},
	{
		key: 'trim',
		label: 'Ribbon and trimmings',
		group: 'consumable',
		kinds: ['ribbon', 'twine', 'embellishments', 'envelopes']
	},
	{
		key: 'cut',
		label: 'To cut with',
		group: 'tool',
		kinds: ['trimmer', 'guillotine-cutter', 'rotary-cutter', 'craft-knife', 'scissors']
	},
	{ key: 'measure', label: 'To measure and cut on', group: 'tool', kinds: ['ruler', 'cutting-mat'] },
	{
		key: 'score',
		label: 'To score and fold with',
		group: 'tool',
		kinds: ['scoring-board', 'scoring-tool', 'bone-folder']
	},
	{
		key: 'punch',
		label: 'Punches',
		group: 'tool',
		kinds: ['corner-punch', 'edge-punch', 'shape-punch', 'hole-punch', 'tab-punch']
	},
	{
		key: 'die',
		label: 'Dies and embossing',
		group: 'tool',
		kinds: ['die-cutter', 'die', 'embossing-folder']
	},
	{
		key: 'finish',
		label: 'To fasten and finish with',
		group: 'tool',
		kinds: ['eyelet-setter', 'heat-tool', 'glue-gun', 'stapler', 'awl', 'brush', 'stamp']
	}
];

/** `corner-punch` as it is said: Corner punch. */
export function kindWords(kind: string): string {
	const words = kind.replaceAll('-', ' ');
	return words.charAt(0).toUpperCase() + words.slice(1);
}

export function groupOf(kind: SupplyKind): Group {
	if ((SHEET_KINDS as readonly string[]).includes(kind)) return 'sheet';
	return (TOOL_KINDS as readonly string[]).includes(kind) ? 'tool' : 'consumable';
}

export const familyOf = (kind: SupplyKind): FamilyKey =>
	FAMILIES.find(({ kinds }) => kinds.includes(kind))?.key ?? 'paper';

/** How the amount of it is told; sheets and tools are counted. */
export const measureOf = (kind: SupplyKind): Measure => SUPPLY_MEASURES[kind as ConsumableKind] ?? 'count';

/** Kinds whose form has the same fields, so that one can be changed into another. */
export const alikeKinds = (kind: SupplyKind): SupplyKind[] =>
	FAMILIES.filter(({ group }) => group === groupOf(kind))
		.flatMap(({ kinds }) => kinds)
		.filter((other) => measureOf(other) === measureOf(kind));
