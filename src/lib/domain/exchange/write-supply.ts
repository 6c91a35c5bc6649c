import { writeCaliper } from '../caliper';
import { INCH, writeExact, type Length, type LengthUnit } from '../length';
import {
	SUPPLY_MEASURES,
	type ConsumableSupply,
	type SheetSupply,
	type Supply,
	type ToolSupply
} from '../stash';
import { writeVolume, type VolumeUnit } from '../volume';
import type { SupplyDocument } from './supply-schema';

/** Writes a supply as an exchange document has it; reading that gives the same supply again. */
export function writeSupply(supply: Supply): SupplyDocument {
	const said = { ...owned(supply), ...own(supply) };
	return Object.fromEntries(
		Object.entries(said).filter(([, value]) => value !== undefined)
	) as SupplyDocument;
}

function owned(supply: Supply) {
	return {
		key: supply.key,
		kind: supply.kind,
		name: supply.name,
		collection: supply.collection ?? undefined,
		bin: supply.bin ?? undefined,
		barcode: supply.barcode ?? undefined,
		price: supply.price ?? undefined,
		arrives: supply.arrives ?? undefined
	};
}

function own(supply: Supply): object {
	if (supply.group === 'sheet') return sheet(supply);
	return supply.group === 'tool' ? tool(supply) : consumable(supply);
}

function sheet(supply: SheetSupply) {
	const [w, h] = [writeExact(supply.w, supply.unit), writeExact(supply.h, supply.unit)];
	return {
		size: `${w.slice(0, w.lastIndexOf(' '))} x ${h}`,
		sheets: supply.sheets,
		count: supply.count === 'unsure' ? supply.count : undefined,
		faces: supply.faces.length > 0 ? supply.faces.map((face) => ({ ...face })) : undefined,
		weight: supply.weight?.text,
		caliper: supply.caliper === null ? undefined : writeCaliper(supply.caliper),
		colours: supply.colours.length > 0 ? [...supply.colours] : undefined,
		offcut: supply.offcut || undefined,
		brandingStrip: supply.strip
			? {
					edge: supply.strip.edge,
					depth: writeExact(supply.strip.depth, unitOf(supply, 'depth', supply.strip.depth, supply.unit))
				}
			: undefined
	};
}

function consumable(supply: ConsumableSupply) {
	return {
		width: written(supply, 'width', supply.width),
		left: amount(supply, supply.left, supply.unit),
		full:
			supply.full === null ? undefined : amount(supply, supply.full, supply.entered?.['full'] ?? supply.unit),
		count: supply.count === 'unsure' ? supply.count : undefined
	};
}

function amount(supply: ConsumableSupply, value: number, unit: string): string | number {
	const measure = SUPPLY_MEASURES[supply.kind];
	if (measure === 'count') return value;
	return measure === 'volume'
		? writeVolume(value, unit as VolumeUnit)
		: writeExact(value, unit as LengthUnit);
}

function tool(supply: ToolSupply) {
	return {
		reach: written(supply, 'reach', supply.reach),
		grooves: written(supply, 'grooves', supply.grooves),
		shape: supply.shape ?? undefined,
		size: written(supply, 'size', supply.size),
		cuts: supply.cuts.length > 0 ? [...supply.cuts] : undefined,
		lentUntil: supply.lentUntil ?? undefined,
		borrowedUntil: supply.borrowedUntil ?? undefined
	};
}

function written(
	supply: ConsumableSupply | ToolSupply,
	field: string,
	value: Length | null
): string | undefined {
	const main = supply.group === 'consumable' ? supply.unit : undefined;
	return value === null ? undefined : writeExact(value, unitOf(supply, field, value, main));
}

/** The unit noted for the field, else the supply's own; where neither is a sheet's unit, what the ruler shows. */
function unitOf(supply: Supply, field: string, value: Length, main?: string): LengthUnit {
	const unit = supply.entered?.[field] ?? main;
	if (unit === 'in' || unit === 'mm' || unit === 'cm') return unit;
	return value % (INCH / 64) === 0 ? 'in' : 'mm';
}
