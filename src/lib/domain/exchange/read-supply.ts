import {
	SHEET_KINDS,
	TOOL_KINDS,
	type ConsumableSupply,
	type SheetSupply,
	type Supply,
	type ToolSupply
} from '../stash';
import { Reading, type BareUnit } from './reading';
import { shaped } from './shape';
import {
	supplySchema,
	type ConsumableDocument,
	type SheetDocument,
	type SupplyDocument,
	type ToolDocument
} from './supply-schema';

/**
 * Reads one supply of an exchange document.
 * @param units what a bare number means
 * @throws Unreadable with every issue found
 */
export function readSupply(json: unknown, units: BareUnit): Supply {
	const reading = new Reading(units);
	const supply = supplyFrom(shaped(supplySchema, json), reading);
	reading.finish();
	return supply;
}

export function supplyFrom(document: SupplyDocument, reading: Reading): Supply {
	if (isSheet(document)) return sheetFrom(document, reading);
	if (isTool(document)) return toolFrom(document, reading);
	return consumableFrom(document, reading);
}

function sheetFrom(document: SheetDocument, reading: Reading): SheetSupply {
	const { w, h, unit } = reading.size('size', document.size);
	const entered = new EnteredUnits(reading, unit);
	return {
		...owned(document, reading),
		group: 'sheet',
		kind: document.kind,
		w,
		h,
		unit,
		sheets: document.sheets,
		count: document.count ?? 'counted',
		faces: document.faces ?? [],
		weight: document.weight === undefined ? null : reading.weight('weight', document.weight),
		caliper: document.caliper === undefined ? null : reading.caliper('caliper', document.caliper),
		colours: document.colours ?? [],
		offcut: document.offcut ?? false,
		strip: stripFrom(document, w, h, entered),
		...entered.kept()
	};
}

function stripFrom(
	document: SheetDocument,
	w: number,
	h: number,
	entered: EnteredUnits
): SheetSupply['strip'] {
	const strip = document.brandingStrip;
	if (!strip) return null;
	const depth = entered.length('depth', strip.depth, 'brandingStrip.depth')!;
	const side = strip.edge === 'top' || strip.edge === 'bottom' ? h : w;
	if (side > 0 && depth >= side)
		entered.reading.fail(
			'brandingStrip.depth',
			'The branding strip takes the whole sheet. Check both figures.'
		);
	return { edge: strip.edge, depth };
}

function consumableFrom(document: ConsumableDocument, reading: Reading): ConsumableSupply {
	const left = reading.amount('left', document.kind, document.left, { zero: true });
	const full = document.full === undefined ? null : reading.amount('full', document.kind, document.full);
	const entered = new EnteredUnits(reading, left.unit);
	if (full) entered.note('full', full.unit);
	return {
		...owned(document, reading),
		group: 'consumable',
		kind: document.kind,
		width: 'width' in document ? entered.length('width', document.width) : null,
		left: left.value,
		full: full && full.value,
		unit: left.unit,
		count: document.count ?? 'counted',
		...entered.kept()
	};
}

function toolFrom(document: ToolDocument, reading: Reading): ToolSupply {
	const entered = new EnteredUnits(reading, null);
	return {
		...owned(document, reading),
		group: 'tool',
		kind: document.kind,
		reach: entered.length('reach', document.reach),
		grooves: entered.length('grooves', document.grooves),
		shape: document.shape ?? null,
		size: entered.length('size', document.size),
		cuts: document.cuts ?? [],
		lentUntil: document.lentUntil ?? null,
		borrowedUntil: document.borrowedUntil ?? null,
		...entered.kept()
	};
}

function owned(document: SupplyDocument, reading: Reading) {
	return {
		key: document.key,
		name: document.name,
		collection: document.collection ?? null,
		bin: document.bin ?? null,
		barcode: document.barcode === undefined ? null : reading.barcode('barcode', document.barcode),
		price: document.price ?? null,
		arrives: document.arrives ?? null
	};
}

/** Notes the units that a supply's own `unit` doesn't tell, so that an export writes what was typed. */
class EnteredUnits {
	private readonly units: Record<string, string> = {};

	constructor(
		readonly reading: Reading,
		private readonly main: string | null
	) {}

	length(field: string, text: string | undefined, path = field): number | null {
		if (text === undefined) return null;
		const { value, unit } = this.reading.lengthAndUnit(path, text);
		this.note(field, unit);
		return value;
	}

	note(field: string, unit: string): void {
		if (unit !== this.main) this.units[field] = unit;
	}

	kept(): { entered?: Readonly<Record<string, string>> } {
		return Object.keys(this.units).length > 0 ? { entered: this.units } : {};
	}
}

const isSheet = (document: SupplyDocument): document is SheetDocument =>
	(SHEET_KINDS as readonly string[]).includes(document.kind);
const isTool = (document: SupplyDocument): document is ToolDocument =>
	(TOOL_KINDS as readonly string[]).includes(document.kind);
