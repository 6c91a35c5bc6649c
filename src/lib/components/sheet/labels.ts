import { spokenLength, type Length } from '$lib/domain/length';
import type { PlannedPlacement, PlannedSheet } from '$lib/domain/matching/verdict';
import type { Rect } from '$lib/domain/cutting/problem';
import type { Units } from '$lib/components/ui/units';
import type { Paper } from './paper';

export interface PieceName {
	readonly letter: string;
	readonly name: string;
}
export type PieceNames = (placement: Pick<PlannedPlacement, 'project' | 'piece'>) => PieceName;

/**
 * Gives every piece of a plan a letter, in the order in which they first lie on its sheets: A … Z, then AA.
 * `nameOf` says what a piece is called in its bill.
 */
export function letterPieces(
	sheets: readonly Pick<PlannedSheet, 'placements'>[],
	nameOf: (project: string, piece: string) => string
): PieceNames {
	const letters = new Map<string, string>();
	for (const { project, piece } of sheets.flatMap((sheet) => sheet.placements)) {
		const key = `${project}\n${piece}`;
		if (!letters.has(key)) letters.set(key, letter(letters.size));
	}
	return ({ project, piece }) => ({
		letter: letters.get(`${project}\n${piece}`) ?? '?',
		name: nameOf(project, piece)
	});
}

const letter = (index: number): string =>
	(index >= 26 ? letter(Math.floor(index / 26) - 1) : '') + String.fromCharCode(65 + (index % 26));

export const offcutKept = (rest: Rect, keep: Length | null) =>
	keep === null || Math.min(rest.w, rest.h) >= keep;

/** The drawing in words, for someone who can't see it. */
export function sheetWords(
	sheet: Pick<PlannedSheet, 'w' | 'h' | 'placements'>,
	paper: Paper,
	names: PieceNames,
	side: 'A' | 'B',
	units: Units
): string {
	const size = (w: Length, h: Length) => `${spokenLength(w, units)} by ${spokenLength(h, units)}`;
	const pieces = sheet.placements.map((piece) => {
		const { letter, name } = names(piece);
		const turned = piece.turned ? ', turned by a quarter' : '';
		const lost = piece.face === side ? '' : ', this face is lost';
		return `${letter}, ${name}, ${size(piece.w, piece.h)}${turned}${lost}`;
	});
	const face = side === 'B' ? ', turned over to its B-side' : '';
	const holds = pieces.length ? `. On it: ${pieces.join('; ')}` : '';
	return `${paper.name}, ${size(sheet.w, sheet.h)}${face}${holds}.`;
}
