import type { Caliper } from './caliper';
import type { Length, LengthUnit } from './length';
import type { Money } from './money';

/** Sheet goods: what can be cut from. */
export const SHEET_KINDS = [
	'patterned-paper',
	'cardstock',
	'chipboard',
	'vellum',
	'plain-paper',
	'kraft-paper',
	'watercolour-paper',
	'mulberry-paper',
	'metallic-paper',
	'glitter-paper',
	'acetate',
	'book-cloth',
	'felt',
	'magnet-sheet',
	'adhesive-sheet'
] as const;

/** Consumables and how their amount is told: by length (some with a width), by volume, or by count. */
export const SUPPLY_MEASURES = {
	tape: 'length',
	'foam-tape': 'length',
	'washi-tape': 'length',
	runner: 'length',
	ribbon: 'length',
	elastic: 'length',
	twine: 'length',
	glue: 'volume',
	'spray-adhesive': 'volume',
	ink: 'volume',
	'glue-stick': 'count',
	'glue-dots': 'count',
	'foam-squares': 'count',
	magnets: 'count',
	brads: 'count',
	eyelets: 'count',
	rings: 'count',
	closures: 'count',
	envelopes: 'count',
	embellishments: 'count'
} as const;

/** What can happen to a supply: the kinds of line in its ledger. */
export const MOVEMENT_KINDS = [
	'bought',
	'counted',
	'cut',
	'used',
	'spoiled',
	'offcut-in',
	'offcut-out',
	'lent',
	'returned',
	'passed-on'
] as const;

export const TOOL_KINDS = [
	'trimmer',
	'guillotine-cutter',
	'rotary-cutter',
	'craft-knife',
	'scissors',
	'ruler',
	'cutting-mat',
	'scoring-board',
	'scoring-tool',
	'bone-folder',
	'corner-punch',
	'edge-punch',
	'shape-punch',
	'hole-punch',
	'tab-punch',
	'die-cutter',
	'die',
	'embossing-folder',
	'eyelet-setter',
	'heat-tool',
	'glue-gun',
	'stapler',
	'awl',
	'brush',
	'stamp'
] as const;

export type SheetGoods = (typeof SHEET_KINDS)[number];
export type ConsumableKind = keyof typeof SUPPLY_MEASURES;
export type ToolKind = (typeof TOOL_KINDS)[number];
export type SupplyKind = SheetGoods | ConsumableKind | ToolKind;

/** A face's print: an up that must stay up, an axis that may be turned end for end, or none. */
export type Direction = 'none' | 'one-way' | 'two-way';
export interface Face {
	readonly design: string;
	readonly direction: Direction;
}
export type Counted = 'counted' | 'unsure';
export type Edge = 'top' | 'bottom' | 'left' | 'right';

/** A weight as the label states it, with its exact-as-possible grams per square metre. */
export interface PaperWeight {
	readonly text: string;
	readonly gsm: number;
}

interface Owned {
	readonly key: string;
	readonly name: string;
	readonly collection: string | null;
	readonly bin: string | null;
	readonly barcode: string | null;
	readonly price: Money | null;
	/** On order: serves from this date (YYYY-MM-DD) on. */
	readonly arrives: string | null;
	/** Units in which measures were entered, by field, where `unit` doesn't say it. */
	readonly entered?: Readonly<Record<string, string>>;
}

export interface SheetSupply extends Owned {
	readonly group: 'sheet';
	readonly kind: SheetGoods;
	/** Full size as the print of face A stands upright; `unit` is the one it was entered in. */
	readonly w: Length;
	readonly h: Length;
	readonly unit: LengthUnit;
	readonly sheets: number;
	readonly count: Counted;
	readonly faces: readonly Face[];
	readonly weight: PaperWeight | null;
	readonly caliper: Caliper | null;
	readonly colours: readonly string[];
	readonly offcut: boolean;
	readonly strip: { readonly edge: Edge; readonly depth: Length } | null;
}

/** `left` and `full` are lengths, volumes (1/16 pl) or counts, as `SUPPLY_MEASURES` says for the kind. */
export interface ConsumableSupply extends Owned {
	readonly group: 'consumable';
	readonly kind: ConsumableKind;
	readonly width: Length | null;
	readonly left: number;
	readonly full: number | null;
	readonly unit: string;
	readonly count: Counted;
}

export interface ToolSupply extends Owned {
	readonly group: 'tool';
	readonly kind: ToolKind;
	readonly reach: Length | null;
	readonly grooves: Length | null;
	readonly shape: string | null;
	readonly size: Length | null;
	/** Materials it says it cuts; a tool that says nothing cuts paper. */
	readonly cuts: readonly ('paper' | 'board')[];
	readonly lentUntil: string | null;
	readonly borrowedUntil: string | null;
}

export type Supply = SheetSupply | ConsumableSupply | ToolSupply;
