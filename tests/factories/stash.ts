/** Supplies and bills as plain values of the domain, each with only what a test is about. */
import type { Bill, Piece, Slot } from '../../src/lib/domain/bill/bill';
import { INCH } from '../../src/lib/domain/length';
import type { ConsumableSupply, SheetSupply, ToolSupply } from '../../src/lib/domain/stash';
import { DEFAULT_OPTIONS, type MatchRequest } from '../../src/lib/domain/matching';

export const inches = (value: number): number => Math.round(value * INCH);

const owned = { collection: null, bin: null, barcode: null, price: null, arrives: null };

/** A row of 12 × 12 in patterned paper, one sheet, nothing known of its faces. */
export function aSheet(key: string, some: Partial<SheetSupply> = {}): SheetSupply {
	return {
		...owned,
		group: 'sheet',
		kind: 'patterned-paper',
		key,
		name: key,
		w: inches(12),
		h: inches(12),
		unit: 'in',
		sheets: 1,
		count: 'counted',
		faces: [],
		weight: null,
		caliper: null,
		colours: [],
		offcut: false,
		strip: null,
		...some
	};
}

/** A quarter-inch tape, 100 in left. */
export function aTape(key: string, some: Partial<ConsumableSupply> = {}): ConsumableSupply {
	return {
		...owned,
		group: 'consumable',
		kind: 'tape',
		key,
		name: key,
		width: inches(1 / 4),
		left: inches(100),
		full: null,
		unit: 'in',
		count: 'counted',
		...some
	};
}

export function aTool(key: string, some: Partial<ToolSupply> = {}): ToolSupply {
	return {
		...owned,
		group: 'tool',
		kind: 'trimmer',
		key,
		name: key,
		reach: null,
		grooves: null,
		shape: null,
		size: null,
		cuts: [],
		lentUntil: null,
		borrowedUntil: null,
		...some
	};
}

/** A slot of patterned paper in one design. */
export function aSlot(key: string, some: Partial<Slot> = {}): Slot {
	return {
		key,
		name: key,
		material: { kind: 'patterned-paper', weight: null, caliper: null },
		designs: 'one',
		sameAs: null,
		differentFrom: [],
		design: null,
		collection: null,
		colour: null,
		swaps: [],
		...some
	};
}

/** One piece, `w` × `h` in inches, of a slot. */
export function aPiece(key: string, slot: string, w: number, h: number, some: Partial<Piece> = {}): Piece {
	return {
		key,
		slot,
		name: key,
		w: inches(w),
		h: inches(h),
		qty: 1,
		up: 'none',
		allowance: 0,
		scores: [],
		corners: [],
		edges: [],
		diagonals: [],
		mount: null,
		wraps: null,
		tape: null,
		...some
	};
}

export function aBill(key: string, some: Partial<Bill> = {}): Bill {
	return {
		key,
		name: key,
		measures: {},
		slots: [],
		pieces: [],
		adhesives: [],
		tools: [],
		extras: [],
		steps: [],
		...some
	};
}

/** A request in mode `each` on 2027-05-10. */
export function aRequest(some: Partial<MatchRequest> = {}): MatchRequest {
	return {
		bills: [],
		supplies: [],
		mode: 'each',
		copies: {},
		on: '2027-05-10',
		options: DEFAULT_OPTIONS,
		...some
	};
}
