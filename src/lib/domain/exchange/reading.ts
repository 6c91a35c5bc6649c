import { workOut } from '../bill/formula';
import { parseCaliper, type Caliper } from '../caliper';
import { readBarcode } from '../gtin';
import { parseLength, parseSize, type Length, type LengthUnit } from '../length';
import { parseWeight } from '../paper-weight';
import { SUPPLY_MEASURES, type ConsumableKind, type PaperWeight } from '../stash';
import { parseVolume } from '../volume';
import { Unreadable, type Issue, type Path } from './unreadable';

/** What a bare number means. */
export type BareUnit = 'in' | 'mm' | 'cm';
interface Entry {
	readonly long?: boolean;
	readonly zero?: boolean;
}

/**
 * Reads a document's measures and keeps every issue with its path. What can't be read comes back as 0 (a text
 * as null) so that the reading goes on; `finish` then throws `Unreadable`.
 */
export class Reading {
	constructor(
		readonly units: BareUnit,
		private readonly under: Path = [],
		private readonly measures: ReadonlyMap<string, Length> | null = null,
		private readonly issues: Issue[] = []
	) {}

	/** The same reading, further down the document. */
	at(...path: Path): Reading {
		return new Reading(this.units, [...this.under, ...path], this.measures, this.issues);
	}

	/** The same reading for a project: with measures that formulas may name, and its own unit if it says one. */
	of(measures: ReadonlyMap<string, Length>, units: BareUnit = this.units): Reading {
		return new Reading(units, this.under, measures, this.issues);
	}

	fail(field: string, message: string): void {
		if (this.issues.length >= MOST_ISSUES) return;
		this.issues.push({ path: [...this.under, field].filter((part) => part !== '').join('.'), message });
	}

	finish(): void {
		if (this.issues.length > 0) throw new Unreadable(this.issues);
	}

	length(field: string, text: string, entry: Entry = {}): Length {
		return this.lengthAndUnit(field, text, entry).value;
	}

	lengthAndUnit(field: string, text: string, entry: Entry = {}): { value: Length; unit: LengthUnit } {
		if (this.measures && text.trimStart().startsWith('=')) {
			const worked = workOut(text.trimStart().slice(1), this.measures, this.units);
			return { value: this.take(field, worked) ?? 0, unit: this.units };
		}
		const read = parseLength(text, { ...entry, unit: this.units });
		return { value: this.take(field, read) ?? 0, unit: read.ok ? read.unit : this.units };
	}

	size(field: string, text: string): { w: Length; h: Length; unit: LengthUnit } {
		const read = parseSize(text, { unit: this.units });
		if (read.ok) return read;
		this.fail(field, read.reason);
		return { w: 0, h: 0, unit: this.units };
	}

	weight(field: string, text: string): PaperWeight | null {
		return this.take(field, parseWeight(text));
	}

	caliper(field: string, text: string): Caliper | null {
		return this.take(field, parseCaliper(text));
	}

	/** Any form of a product's number, as 13 digits. */
	barcode(field: string, text: string): string | null {
		const read = readBarcode(text);
		return this.take(field, read.ok ? { ok: true, value: read.gtin } : read);
	}

	/** An amount of a consumable: a length, a volume or a whole number, as its kind is told. */
	amount(
		field: string,
		kind: ConsumableKind,
		given: string | number,
		entry: Entry = {}
	): { value: number; unit: string } {
		const measure = SUPPLY_MEASURES[kind];
		if (measure === 'count' || typeof given === 'number') {
			if (measure === 'count' && typeof given === 'number') return { value: given, unit: 'count' };
			this.fail(field, measure === 'count' ? COUNTED : MEASURED[measure]);
			return { value: 0, unit: 'count' };
		}
		if (measure === 'length') return this.lengthAndUnit(field, given, { ...entry, long: true });
		const read = parseVolume(given, { ...entry, unit: this.units === 'in' ? 'fl oz' : 'ml' });
		return { value: this.take(field, read) ?? 0, unit: read.ok ? read.unit : 'ml' };
	}

	private take<Value>(
		field: string,
		read: { ok: true; value: Value } | { ok: false; reason: string }
	): Value | null {
		if (read.ok) return read.value;
		this.fail(field, read.reason);
		return null;
	}
}

const MOST_ISSUES = 100;
const COUNTED = 'These are counted: give a whole number.';
const MEASURED = {
	length: 'This comes by length: give one, like "98 in" or "8 m".',
	volume: 'This comes by volume: give one, like "250 ml" or "4 fl oz".'
} as const;
