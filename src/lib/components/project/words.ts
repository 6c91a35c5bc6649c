import type { BillDocument } from '$lib/domain/exchange';
import { formatLength, formatSize, type Length } from '$lib/domain/length';
import type { LineResult, NearMiss, ProjectResult, Shortage } from '$lib/domain/matching/verdict';
import { SUPPLY_MEASURES, type ConsumableKind } from '$lib/domain/stash';
import { formatVolume } from '$lib/domain/volume';
import { kindWords } from '$lib/components/supply/kinds';
import { dayOf } from '$lib/components/ui/verdict-words';
import type { Units } from '$lib/components/ui/units';

export const count = (n: number, one: string, many = `${one}s`) => `${n} ${n === 1 ? one : many}`;

/** What a result's line, like `slots/cover`, is called in its bill. */
export function lineName(bill: BillDocument, line: string): string {
	if (line === 'tools/board-cut') return 'A tool that cuts board';
	const [list, key] = line.split('/');
	if (list === 'slots') return bill.slots.find((slot) => slot.key === key)?.name ?? kindWords(key ?? '');
	if (list === 'tools') {
		const tool = bill.tools?.find((known) => known.key === key);
		return tool?.name ?? kindWords(tool?.kind ?? '');
	}
	const need = consumable(bill, line);
	return need?.name ?? kindWords(need?.kind ?? '');
}

/** The kind of supply that would serve a line; undefined where several kinds would. */
export function kindWanted(bill: BillDocument, line: string): string | undefined {
	const [list, key] = line.split('/');
	if (list === 'slots') return bill.slots.find((slot) => slot.key === key)?.material.kind;
	if (list === 'tools') return bill.tools?.find((tool) => tool.key === key)?.kind;
	return consumable(bill, line)?.kind;
}

export const pieceName = (bill: BillDocument, key: string) =>
	bill.pieces.find((piece) => piece.key === key)?.name ?? kindWords(key ?? '');

/** The one line on a flap's edge: what it takes, or what stands in its way first. */
export function edgeWords(bill: BillDocument, result: ProjectResult): string {
	const named = (lines: readonly { readonly line: string }[]) => {
		const [first, ...rest] = lines.map(({ line }) => lineName(bill, line));
		return `${first ?? ''}${rest.length > 0 ? ` and ${rest.length} more` : ''}`;
	};
	const at = (verdict: LineResult['verdict']) => result.lines.filter((line) => line.verdict === verdict);
	const copies = result.copies > 1 ? `${result.copies} copies: ` : '';
	if (result.nowIfFirst)
		return `${copies}Now, if moved first: others before it hold its ${named(result.short).toLowerCase()}`;
	switch (result.verdict) {
		case 'short':
			return `${copies}Lacks ${named(result.short)}`;
		case 'look':
			return `${copies}${named(at('look'))}: ${at('look')[0]?.why ?? 'look before you cut'}`;
		case 'after':
			return `${copies}Waits for ${named(at('after'))}`;
		case 'swap':
			return `${copies}A swap for ${named(at('swap'))}`;
		default:
			return `${copies}${makings(bill, result)}`;
	}
}

function makings(bill: BillDocument, { plan, copies }: ProjectResult): string {
	const pieces = bill.pieces.reduce((sum, piece) => sum + (piece.qty ?? 1), 0) * copies;
	return plan
		? `${count(pieces, 'piece')} from ${count(plan.sheets.length, 'sheet')}`
		: count(pieces, 'piece');
}

/** What a shortage asks for: sheets of a size, a tool, or so much of a roll, bottle or box. */
export function wantedWords(bill: BillDocument, shortage: Shortage, units: Units): string {
	if ('tool' in shortage) return `No ${inSentence(shortage.tool)} that serves`;
	if ('amount' in shortage) {
		const need = consumable(bill, shortage.line);
		return `${amountWords(need?.kind, shortage.amount, units)} more ${inSentence(need?.kind ?? '')}`;
	}
	const sheets = shortage.sheets.map(
		({ w, h, count: n, custom }) =>
			`${count(n, 'more sheet', 'more sheets')} of ${formatSize(w, h, units)}${custom ? ', a size of its own' : ''}`
	);
	return sheets.length > 0 ? sheets.join(' and ') : 'No paper that serves';
}

export const missingPieces = (bill: BillDocument, shortage: Shortage) =>
	'pieces' in shortage
		? Object.entries(shortage.pieces).map(([key, n]) => `${n} × ${pieceName(bill, key)}`)
		: [];

/** `by` is said in both systems: at 1/16 in the two figures may print alike. */
export function nearWords(bill: BillDocument, near: NearMiss, paper: string): string {
	const side = near.side === 'w' ? 'width' : 'height';
	return `${lineName(bill, near.line)}: ${paper} misses its ${side} by only ${formatLength(near.by, 'in')} (${formatLength(near.by, 'mm')}).`;
}

/** Lines that are met, but not plainly: in the reader's words. */
export function lineNotes(bill: BillDocument, result: ProjectResult, nameOf: (supply: string) => string) {
	return result.lines.flatMap((line) => {
		const text = lineNote(lineName(bill, line.line), line, line.supplies?.map(nameOf) ?? []);
		return text ? [{ line: line.line, verdict: line.verdict, text }] : [];
	});
}

function lineNote(name: string, line: LineResult, supplies: readonly string[]): string | null {
	const others = supplies.filter((supply) => supply !== name).join(' and ');
	switch (line.verdict) {
		case 'swap':
			return `${name}: ${others || 'what you have'} serves, a swap that the bill allows.`;
		case 'after':
			return `${name}: ${others ? `${others}, ` : ''}${line.after ? `from ${dayOf(line.after)} on` : 'later'}.`;
		case 'look':
			return `${name}: ${line.why ?? 'look before you cut'}.`;
		default:
			return line.tight ? `${name} is tight: hardly any will be left over.` : null;
	}
}

export function amountWords(kind: ConsumableKind | undefined, amount: number, units: Units): string {
	const measure = kind && SUPPLY_MEASURES[kind];
	if (measure === 'length') return formatLength(amount as Length, units);
	if (measure === 'volume') return formatVolume(amount, units === 'in' ? 'fl oz' : 'ml');
	return String(amount);
}

function consumable(bill: BillDocument, line: string) {
	const [list, key] = line.split('/');
	const lines = list === 'extras' ? bill.extras : bill.adhesives;
	return lines?.find((need) => need.key === key);
}

/** A kind inside a sentence: `corner punch`. */
export const inSentence = (kind: string) => kindWords(kind).toLowerCase();
