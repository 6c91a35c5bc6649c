import { z } from 'zod';
import { parseSize } from '../domain/length';
import { SHEET_KINDS, SUPPLY_MEASURES, TOOL_KINDS, type ConsumableKind } from '../domain/stash';
import type { RoomUnits } from './rooms';

export const CONSUMABLE_KINDS = Object.keys(SUPPLY_MEASURES) as [ConsumableKind, ...ConsumableKind[]];
export const SUPPLY_KINDS = [...SHEET_KINDS, ...CONSUMABLE_KINDS, ...TOOL_KINDS] as const;
export const SUPPLY_SORTS = ['name', 'kind', 'amount', 'added', 'size', 'bin', 'collection'] as const;
const SORTS = SUPPLY_SORTS.flatMap((by) => [by, `-${by}`] as const);

const words = z.string().trim().min(1).max(100).optional().catch(undefined);
const flag = z
	.enum(['1', 'true', 'on'])
	.transform(() => true)
	.optional()
	.catch(undefined);

/** The stash's filters as they stand in an address. What makes no sense is left out, not refused. */
export const supplyFilterSchema = z.object({
	q: words,
	group: z.enum(['sheet', 'consumable', 'tool']).optional().catch(undefined),
	kind: z.enum(SUPPLY_KINDS).optional().catch(undefined),
	bin: words,
	collection: words,
	barcode: words,
	/** At least this much left, either way round: `4 1/4 x 5 1/2 in`. */
	size: words,
	offcut: flag,
	unsure: flag,
	/** Ordered, and not here yet. */
	coming: flag,
	lent: flag,
	sort: z.enum(SORTS).optional().catch(undefined),
	page: z.coerce.number().int().min(1).max(100_000).catch(1)
});

type Typed = z.output<typeof supplyFilterSchema>;
export type SupplyFilter = Omit<Typed, 'size'> & {
	/** In 1/320 mm. */
	readonly size?: { readonly w: number; readonly h: number };
	/** Why a size that was asked for can't be read; it filters nothing. */
	readonly sizeRefused?: string;
};

/** Reads the filters of an address; a bare number in `size` is in the room's unit. */
export function readSupplyFilter(params: URLSearchParams, units: RoomUnits): SupplyFilter {
	const { size: typed, ...filter } = supplyFilterSchema.parse(Object.fromEntries(params));
	if (!typed) return filter;
	const size = parseSize(typed, { unit: units });
	return size.ok ? { ...filter, size: { w: size.w, h: size.h } } : { ...filter, sizeRefused: size.reason };
}
