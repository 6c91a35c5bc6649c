import type { SupplyDocument } from '../../domain/exchange';
import { parseLength } from '../../domain/length';
import type { SheetGoods } from '../../domain/stash';
import type { BenchItem, Welcome } from '../../schemas/welcome';
import type { Transaction } from '../db/client';
import { Forbidden } from '../errors';
import { stashForMatching } from '../queries/stash';
import type { Actor } from '../session';
import { importRoom } from './exchange';
import { changeRoomSettings } from './rooms';

/**
 * Sets a room up from the first hour's answers: its units, its trimmer's reach, and a row for each thing named. A
 * row that an earlier answer made stays as it stands: what was counted since is truer than a guess.
 */
export async function setUpRoom(tx: Transaction, actor: Actor, answers: Welcome): Promise<void> {
	if (actor.role !== 'owner') throw new Forbidden();
	const { name, units } = answers;
	const reach = answers.reach === '' ? null : parseLength(answers.reach, { unit: units });
	await changeRoomSettings(tx, actor, { name, units, reach: reach?.ok ? reach.value : null, setUp: true });
	const there = new Set((await stashForMatching(tx, actor)).map(({ key }) => key));
	const answered = [...answers.items.map((item) => benchRow(item, answers)), ...paperRows(answers)];
	const supplies = answered.filter(({ key }) => !there.has(key));
	if (supplies.length === 0) return;
	await importRoom(tx, actor, { id: answers.id, document: { format: 'paperlarder', version: 1, supplies } });
}

function benchRow(item: BenchItem, { units, reach }: Welcome): SupplyDocument {
	const inches = units === 'in';
	const key = `first-${item}`;
	switch (item) {
		case 'trimmer':
			return {
				key,
				kind: item,
				name: 'Trimmer',
				cuts: ['paper'],
				...(reach && { reach: withUnit(reach, units) })
			};
		case 'scoring-board':
			return inches
				? { key, kind: item, name: 'Scoring board', reach: '12 in', grooves: '1/8 in' }
				: { key, kind: item, name: 'Scoring board', reach: '30 cm', grooves: '5 mm' };
		case 'paper-knife':
			return { key, kind: 'craft-knife', name: 'Craft knife', cuts: ['paper'] };
		case 'board-knife':
			return { key, kind: 'craft-knife', name: 'Board knife', cuts: ['paper', 'board'] };
		case 'ruler':
			return { key, kind: item, name: 'Safety ruler' };
		case 'corner-punch':
			return { key, kind: item, name: 'Round corner punch', shape: 'round' };
		case 'bone-folder':
		case 'scissors':
		case 'cutting-mat':
		case 'hole-punch':
		case 'glue-gun':
		case 'heat-tool':
			return { key, kind: item, name: named(item) };
		case 'tape':
			return { key, kind: item, count: 'unsure', ...(inches ? QUARTER_INCH_TAPE : SIX_MM_TAPE) };
		case 'runner':
			return { key, kind: item, name: 'Tape runner', left: '8 m', count: 'unsure' };
		case 'glue':
			return { key, kind: item, name: 'Liquid glue', left: '100 ml', count: 'unsure' };
		default:
			return { key, kind: item, name: named(item), left: item === 'glue-stick' ? 1 : 100, count: 'unsure' };
	}
}

const QUARTER_INCH_TAPE = { name: 'Quarter-inch tape', width: '1/4 in', left: '20 yd' };
const SIX_MM_TAPE = { name: '6 mm tape', width: '6 mm', left: '20 m' };

function paperRows(answers: Welcome): SupplyDocument[] {
	const inches = answers.units === 'in';
	const large = inches ? '12 x 12 in' : '30.5 x 30.5 cm';
	const small = inches ? '8 1/2 x 11 in' : '21 x 29.7 cm';
	const rows: readonly (readonly [number | null, string, SheetGoods, string, string])[] = [
		[answers.patterned, 'patterned', 'patterned-paper', 'Patterned paper, large', large],
		[answers.cardstock, 'cardstock', 'cardstock', 'Cardstock, large', large],
		[answers.smallPatterned, 'patterned-small', 'patterned-paper', 'Patterned paper, page size', small],
		[answers.smallCardstock, 'cardstock-small', 'cardstock', 'Cardstock, page size', small],
		[answers.chipboard, 'chipboard', 'chipboard', 'Chipboard', large],
		[answers.kraft, 'kraft', 'kraft-paper', 'Kraft paper', small]
	];
	return rows.flatMap(([sheets, key, kind, name, size]) =>
		sheets ? [{ key: `first-${key}`, kind, name, size, sheets, count: 'unsure' as const }] : []
	);
}

/** A bare number keeps meaning what it meant here, whatever the room measures in later. */
const withUnit = (length: string, units: string) =>
	/[a-z"”′]/i.test(length) ? length : `${length} ${units}`;

function named(kind: string): string {
	const words = kind.replaceAll('-', ' ');
	return words.charAt(0).toUpperCase() + words.slice(1);
}
