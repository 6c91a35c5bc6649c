/** A seeded stash and bills of the kind that a room holds after some years: nothing real, the same every time. */
import type { Bill, Piece, Slot } from '../../src/lib/domain/bill/bill';
import { seeded } from '../../src/lib/domain/cutting/random';
import type { Supply } from '../../src/lib/domain/stash';
import { aBill, aPiece, aSheet, aSlot, aTape, aTool, inches } from '../factories/stash';

type Random = () => number;

const PAPERS = [
	['patterned-paper', 55],
	['cardstock', 30],
	['chipboard', 4],
	['vellum', 5],
	['kraft-paper', 6]
] as const;
const SIZES = [
	[12, 12, 60],
	[8.5, 11, 20],
	[6, 6, 10],
	[8, 8, 10]
] as const;
const DIRECTIONS = ['none', 'one-way', 'two-way', 'none'] as const;

export function stashOf(rows: number, seed: number): Supply[] {
	const random = seeded(seed);
	return Array.from({ length: rows }, (_, i): Supply => {
		const roll = random();
		if (roll < 0.02)
			return aTape(`tape-${i}`, {
				width: pick(random, [1 / 8, 1 / 4, 1 / 2].map(inches)),
				left: inches(20 + below(random, 400))
			});
		if (roll < 0.04) return toolOf(`tool-${i}`, random);
		return sheetOf(`sheet-${i}`, random);
	});
}

function sheetOf(key: string, random: Random): Supply {
	const offcut = random() < 0.25;
	const [w, h] = offcut
		? [2 + below(random, 160) / 16, 2 + below(random, 160) / 16]
		: weighted(random, SIZES);
	const [kind] = weighted(random, PAPERS);
	const faces = kind === 'patterned-paper' ? 2 : 0;
	return aSheet(key, {
		kind,
		collection: `Collection ${below(random, 60)}`,
		w: inches(w),
		h: inches(h),
		sheets: offcut ? 1 : 1 + below(random, kind === 'cardstock' ? 12 : 4),
		count: random() < 0.05 ? 'unsure' : 'counted',
		faces: Array.from({ length: faces }, (_, side) => ({
			design: `${key} ${side}`,
			direction: pick(random, DIRECTIONS)
		})),
		offcut,
		arrives: random() < 0.01 ? '2027-06-01' : null
	});
}

function toolOf(key: string, random: Random): Supply {
	const kind = pick(random, ['trimmer', 'scoring-board', 'corner-punch', 'craft-knife'] as const);
	return aTool(key, {
		kind,
		reach: inches(12),
		grooves: kind === 'scoring-board' ? inches(1 / 8) : null,
		shape: kind === 'corner-punch' ? pick(random, ['wave', 'round', 'ticket']) : null,
		cuts: kind === 'craft-knife' ? ['paper', 'board'] : [],
		lentUntil: random() < 0.1 ? '2027-05-20' : null
	});
}

/** Bills of 5 to 60 pieces in one to four slots. */
export function billsOf(count: number, seed: number): Bill[] {
	const random = seeded(seed);
	return Array.from({ length: count }, (_, i) => billOf(`project-${i}`, random));
}

function billOf(key: string, random: Random): Bill {
	const slots = Array.from({ length: 1 + below(random, 4) }, (_, i): Slot => {
		const [kind] = weighted(random, PAPERS);
		const before = i > 0 && random() < 0.3;
		return aSlot(`slot-${i}`, {
			material: { kind, weight: null, caliper: null },
			designs: random() < 0.7 ? 'one' : 'mixed',
			differentFrom: before ? [`slot-${i - 1}`] : []
		});
	});
	const total = 5 + below(random, 56);
	const kinds = Math.min(total, slots.length + below(random, 6));
	const pieces = Array.from({ length: kinds }, (_, i): Piece => {
		const slot = slots[i % slots.length]?.key ?? 'slot-0';
		const [w, h] = [1 + below(random, 60) / 8, 1 + below(random, 60) / 8];
		const qty = Math.max(1, Math.floor(total / kinds));
		return aPiece(`piece-${i}`, slot, w, h, { qty, up: pick(random, ['h', 'none', 'none'] as const) });
	});
	const tape = {
		key: 'rim',
		name: 'rim',
		kind: 'tape',
		width: inches(1 / 4),
		need: inches(20 + below(random, 150)),
		swaps: []
	} as const;
	return aBill(key, { slots, pieces, adhesives: random() < 0.8 ? [tape] : [] });
}

function below(random: Random, end: number): number {
	return Math.floor(random() * end);
}

function pick<T>(random: Random, list: readonly T[]): T {
	return list[below(random, list.length)] as T;
}

function weighted<T extends readonly [...unknown[], number]>(random: Random, list: readonly T[]): T {
	let roll = random() * list.reduce((sum, one) => sum + (one.at(-1) as number), 0);
	return list.find((one) => (roll -= one.at(-1) as number) < 0) ?? (list[0] as T);
}
