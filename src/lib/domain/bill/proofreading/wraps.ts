import type { Length } from '../../length';
import type { Piece } from '../bill';
import { lineOf, type Finding, type Proof } from './finding';

/** Case wraps: the sheet is its boards, the hinge gaps between them and a turn-in at both ends. */
export function wrapFindings(proof: Proof): Finding[] {
	return proof.bill.pieces.flatMap((piece) => {
		const boards = (piece.wraps?.boards ?? []).flatMap((key) => proof.piece(key) ?? []);
		if (!piece.wraps || boards.length === 0) return [];
		const wrap = { ...piece.wraps, piece, boards };
		return [...along(wrap, proof), ...across(wrap, proof), ...gaps(wrap), ...boardCounts(wrap, proof)];
	});
}

interface Wrap {
	readonly piece: Piece;
	readonly boards: readonly Piece[];
	readonly gaps: readonly Length[];
	readonly turnIn: Length;
	readonly along: 'w' | 'h';
}

function along(wrap: Wrap, proof: Proof): Finding[] {
	const { piece, boards, gaps, turnIn } = wrap;
	const boardSum = sum(boards.map((board) => board[wrap.along]));
	const needed = boardSum + sum(gaps) + 2 * turnIn;
	if (needed === piece[wrap.along]) return [];
	const parts = [
		`boards ${proof.say(boardSum)}`,
		...(gaps.length > 0 ? [`hinge gaps ${proof.say(sum(gaps))}`] : []),
		`two turn-ins ${proof.say(2 * turnIn)}`
	];
	return [short(wrap, wrap.along, needed, parts.join(' + '), proof)];
}

function across(wrap: Wrap, proof: Proof): Finding[] {
	const side = wrap.along === 'w' ? 'h' : 'w';
	const tallest = Math.max(...wrap.boards.map((board) => board[side]));
	const needed = tallest + 2 * wrap.turnIn;
	if (needed === wrap.piece[side]) return [];
	const parts = `board ${proof.say(tallest)} + two turn-ins ${proof.say(2 * wrap.turnIn)}`;
	return [short(wrap, side, needed, parts, proof)];
}

function short({ piece }: Wrap, side: 'w' | 'h', needed: Length, parts: string, proof: Proof): Finding {
	return {
		line: lineOf(piece),
		rule: 'wrap-adds-up',
		severity: 'mend',
		message: `“${piece.name}” is ${proof.say(piece[side])} ${side === 'w' ? 'wide' : 'high'}, but ${parts} come to ${proof.say(needed)}.`,
		mend: {
			text: `Make it ${proof.say(needed)} ${side === 'w' ? 'wide' : 'high'}.`,
			change: { path: proof.path(piece, side), value: proof.type(needed) }
		}
	};
}

function gaps({ piece, boards, gaps: given }: Wrap): Finding[] {
	const between = boards.length - 1;
	if (given.length === between) return [];
	return [
		{
			line: lineOf(piece),
			rule: 'wrap-gaps',
			severity: 'ask',
			message: `${count(boards.length, 'board')} ${boards.length === 1 ? 'has' : 'have'} ${count(between, 'hinge gap')}; the bill gives ${given.length}.`,
			mend: { text: `Give ${count(between, 'hinge gap')}, in the order in which the boards lie.` }
		}
	];
}

function boardCounts({ piece, boards }: Wrap, proof: Proof): Finding[] {
	return [...new Set(boards)].flatMap((board): Finding[] => {
		const needed = piece.qty * boards.filter((one) => one === board).length;
		if (needed === board.qty) return [];
		return [
			{
				line: lineOf(board),
				rule: 'count-differs',
				severity: board.qty < needed ? 'mend' : 'ask',
				message: `${count(piece.qty, 'wrap')} “${piece.name}” cover ${needed} of “${board.name}”; the bill cuts ${board.qty}.`,
				mend: { text: `Cut ${needed}.`, change: { path: proof.path(board, 'qty'), value: needed } }
			}
		];
	});
}

const sum = (lengths: readonly Length[]) => lengths.reduce((total, length) => total + length, 0);
const count = (n: number, one: string) => `${n} ${one}${n === 1 ? '' : 's'}`;
