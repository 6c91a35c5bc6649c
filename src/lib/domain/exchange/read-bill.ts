import type { Bill, Material, Piece, Slot } from '../bill/bill';
import { measuresIn } from '../bill/formula';
import type { Length } from '../length';
import { billSchema, type BillDocument, type PieceDocument, type SlotDocument } from './bill-schema';
import { checkReferences } from './references';
import { consumableNeedFrom, toolNeedFrom } from './read-needs';
import { Reading, type BareUnit } from './reading';
import { shaped } from './shape';

/**
 * Reads one project of an exchange document and works its formulas out.
 * @param units what a bare number means where the bill doesn't say
 * @throws Unreadable with every issue found
 */
export function readBill(json: unknown, units: BareUnit): Bill {
	const reading = new Reading(units);
	const bill = billFrom(shaped(billSchema, json), reading);
	reading.finish();
	return bill;
}

export function billFrom(document: BillDocument, outer: Reading): Bill {
	const measures = measuresFrom(document, outer);
	const reading = outer.of(measures, document.units);
	checkReferences(document, reading);
	const unused = unusedMeasures(document);
	return {
		key: document.key,
		name: document.name,
		measures: Object.fromEntries(measures),
		...(unused.length > 0 ? { unusedMeasures: unused } : {}),
		slots: document.slots.map((slot, index) => slotFrom(slot, reading.at('slots', index))),
		pieces: document.pieces.map((piece, index) => pieceFrom(piece, reading.at('pieces', index))),
		adhesives: (document.adhesives ?? []).map((line, index) =>
			consumableNeedFrom(line, reading.at('adhesives', index))
		),
		tools: (document.tools ?? []).map((line, index) => toolNeedFrom(line, reading.at('tools', index))),
		extras: (document.extras ?? []).map((line, index) =>
			consumableNeedFrom(line, reading.at('extras', index))
		),
		steps: (document.steps ?? []).map(({ text, tools, pieces }) => ({
			text,
			tools: tools ?? [],
			pieces: pieces ?? []
		}))
	};
}

/** A measure's formula may name the measures above it, so that nothing can go round in a circle. */
function measuresFrom(document: BillDocument, outer: Reading): ReadonlyMap<string, Length> {
	const measures = new Map<string, Length>();
	const reading = outer.of(measures, document.units).at('measures');
	for (const [name, text] of Object.entries(document.measures ?? {})) {
		measures.set(name, reading.length(name, text));
	}
	return measures;
}

function unusedMeasures(document: BillDocument): string[] {
	const used = new Set(formulasIn(document).flatMap(measuresIn));
	return Object.keys(document.measures ?? {}).filter((name) => !used.has(name));
}

function formulasIn(part: unknown): string[] {
	if (typeof part === 'string') return part.trimStart().startsWith('=') ? [part] : [];
	return typeof part === 'object' && part !== null ? Object.values(part).flatMap(formulasIn) : [];
}

function slotFrom(slot: SlotDocument, reading: Reading): Slot {
	return {
		key: slot.key,
		name: slot.name ?? slot.key,
		material: materialFrom(slot.material, reading.at('material')),
		designs: slot.designs ?? 'one',
		sameAs: slot.sameAs ?? null,
		differentFrom: slot.differentFrom ?? [],
		design: slot.design ?? null,
		collection: slot.collection ?? null,
		colour: slot.colour ?? null,
		swaps: (slot.swaps ?? []).map((swap, index) => materialFrom(swap, reading.at('swaps', index)))
	};
}

function materialFrom(material: SlotDocument['material'], reading: Reading): Material {
	const { weight, caliper } = material;
	const read = {
		kind: material.kind,
		weight: weight
			? {
					min: weight.min === undefined ? null : reading.weight('weight.min', weight.min),
					max: weight.max === undefined ? null : reading.weight('weight.max', weight.max)
				}
			: null,
		caliper: caliper
			? {
					min: caliper.min === undefined ? null : reading.caliper('caliper.min', caliper.min),
					max: caliper.max === undefined ? null : reading.caliper('caliper.max', caliper.max)
				}
			: null
	};
	if (read.weight?.min && read.weight.max && read.weight.min.gsm > read.weight.max.gsm)
		reading.fail('weight', 'The least weight is more than the most. Change one of the two.');
	if (read.caliper?.min && read.caliper.max && read.caliper.min > read.caliper.max)
		reading.fail('caliper', 'The least thickness is more than the most. Change one of the two.');
	return read;
}

function pieceFrom(piece: PieceDocument, reading: Reading): Piece {
	const { w, h } = { w: reading.length('w', piece.w), h: reading.length('h', piece.h) };
	const allowance =
		piece.allowance === undefined ? 0 : reading.length('allowance', piece.allowance, { zero: true });
	if (w > 0 && h > 0 && allowance >= Math.min(w, h))
		reading.fail('allowance', 'Cut that much smaller, nothing of the piece is left.');
	return {
		key: piece.key,
		slot: piece.slot,
		name: piece.name ?? piece.key,
		w,
		h,
		qty: piece.qty ?? 1,
		up: piece.up ?? 'none',
		allowance,
		scores: (piece.scores ?? []).map(({ from, at, fold }, index) => ({
			from,
			at: reading.length(`scores.${index}.at`, at),
			fold: fold ?? 'none'
		})),
		corners: piece.corners ?? [],
		edges: piece.edges ?? [],
		diagonals: (piece.diagonals ?? []).map(({ from, to }, index) => ({
			from: pointFrom(from, reading.at('diagonals', index, 'from')),
			to: pointFrom(to, reading.at('diagonals', index, 'to'))
		})),
		mount: piece.mount
			? {
					on: piece.mount.on,
					border:
						piece.mount.border === undefined
							? null
							: reading.length('mount.border', piece.mount.border, { zero: true })
				}
			: null,
		wraps: piece.wraps
			? {
					boards: piece.wraps.boards,
					gaps: (piece.wraps.gaps ?? []).map((gap, index) => reading.length(`wraps.gaps.${index}`, gap)),
					turnIn: reading.length('wraps.turnIn', piece.wraps.turnIn),
					along: piece.wraps.along ?? 'w'
				}
			: null,
		tape: piece.tape ?? null
	};
}

function pointFrom(point: { x: string; y: string }, reading: Reading): { x: Length; y: Length } {
	return { x: reading.length('x', point.x, { zero: true }), y: reading.length('y', point.y, { zero: true }) };
}
