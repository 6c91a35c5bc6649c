import type { ConsumableNeed, ToolNeed } from '../bill/bill';
import { SUPPLY_MEASURES, type ConsumableKind } from '../stash';
import type { ConsumableNeedDocument, ToolNeedDocument } from './bill-schema';
import type { Reading } from './reading';

export function consumableNeedFrom(line: ConsumableNeedDocument, reading: Reading): ConsumableNeed {
	return {
		key: line.key,
		name: line.name ?? line.key,
		kind: line.kind,
		width: widthFrom('width', line.kind, line.width, reading),
		need: reading.amount('need', line.kind, line.need).value,
		swaps: (line.swaps ?? []).map((swap, index) => {
			if (SUPPLY_MEASURES[swap.kind] !== SUPPLY_MEASURES[line.kind])
				reading.fail(
					`swaps.${index}.kind`,
					`A swap for ${named(line.kind)} has to come by ${SUPPLY_MEASURES[line.kind]} too; this comes by ${SUPPLY_MEASURES[swap.kind]}.`
				);
			return {
				kind: swap.kind,
				width: widthFrom(`swaps.${index}.width`, swap.kind, swap.width, reading),
				times: swap.times ?? 1
			};
		})
	};
}

export function toolNeedFrom(line: ToolNeedDocument, reading: Reading): ToolNeed {
	const length = (field: string, text: string | undefined) =>
		text === undefined ? null : reading.length(field, text);
	return {
		key: line.key,
		name: line.name ?? line.key,
		kind: line.kind,
		reach: length('reach', line.reach),
		grooves: length('grooves', line.grooves),
		shape: line.shape ?? null,
		size: length('size', line.size),
		cuts: line.cuts ?? [],
		swaps: (line.swaps ?? []).map((swap, index) => ({
			kind: swap.kind,
			shape: swap.shape ?? null,
			size: length(`swaps.${index}.size`, swap.size),
			reach: length(`swaps.${index}.reach`, swap.reach)
		}))
	};
}

function widthFrom(
	field: string,
	kind: ConsumableKind,
	text: string | undefined,
	reading: Reading
): number | null {
	if (text === undefined) return null;
	if (SUPPLY_MEASURES[kind] === 'length') return reading.length(field, text);
	reading.fail(field, `Only what comes by length has a width; ${named(kind)} doesn’t.`);
	return null;
}

const named = (kind: ConsumableKind) => kind.replaceAll('-', ' ');
