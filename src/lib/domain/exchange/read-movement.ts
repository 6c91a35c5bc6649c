import { writeExact, type LengthUnit } from '../length';
import { SUPPLY_MEASURES, type Supply } from '../stash';
import { writeVolume, type VolumeUnit } from '../volume';
import type { MovementDocument } from './document-schema';
import type { Reading } from './reading';

/** One line of the ledger: `change` is sheets, 1/320 mm, 1/16 nl or a count, as the supply's kind says. */
export interface Movement {
	readonly key: string;
	readonly supply: string;
	readonly kind: MovementDocument['kind'];
	readonly change: number;
	/** UTC, as ISO 8601 writes it. */
	readonly at: string;
	readonly act: string | null;
	readonly by: string | null;
	readonly why: string | null;
	readonly undoes: string | null;
}

export function movementFrom(line: MovementDocument, supply: Supply | undefined, reading: Reading): Movement {
	if (!supply) reading.fail('supply', `This document has no supply with the key “${line.supply}”.`);
	return {
		key: line.key,
		supply: line.supply,
		kind: line.kind,
		change: supply ? changeFrom(line.change, supply, reading) : 0,
		at: line.at,
		act: line.act ?? null,
		by: line.by ?? null,
		why: line.why ?? null,
		undoes: line.undoes ?? null
	};
}

/** Writes a ledger line's change in the unit of its supply. */
export function writeChange(change: number, supply: Supply): number | string {
	const measure = supply.group === 'consumable' ? SUPPLY_MEASURES[supply.kind] : 'count';
	if (supply.group !== 'consumable' || measure === 'count') return change;
	const size = Math.abs(change);
	const written =
		measure === 'volume'
			? writeVolume(size, supply.unit as VolumeUnit)
			: writeExact(size, supply.unit as LengthUnit);
	return change < 0 ? `-${written}` : written;
}

function changeFrom(change: number | string, supply: Supply, reading: Reading): number {
	if (supply.group === 'consumable') {
		const below = typeof change === 'string' && /^[-−]/.test(change);
		const size = below ? change.slice(1) : change;
		const { value } = reading.amount('change', supply.kind, size, { zero: true });
		return below ? 0 - value : value;
	}
	if (typeof change === 'number') return change;
	reading.fail('change', 'These are counted: give a whole number.');
	return 0;
}
