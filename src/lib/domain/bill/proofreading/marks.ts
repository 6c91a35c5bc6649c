import type { Edge } from '../../stash';
import type { Piece } from '../bill';
import { lineOf, type Finding, type Proof } from './finding';

/** Scores and diagonal cuts that miss their piece, and scores that stand in one place twice. */
export function markFindings(proof: Proof): Finding[] {
	return proof.bill.pieces.flatMap((piece) => [
		...scoresOutside(piece, proof),
		...scoresTwice(piece, proof),
		...diagonalsOutside(piece, proof)
	]);
}

const OPPOSITE: Readonly<Record<Edge, Edge>> = { left: 'right', right: 'left', top: 'bottom', bottom: 'top' };
const across = (edge: Edge) => (edge === 'left' || edge === 'right' ? 'w' : 'h');

function scoresOutside(piece: Piece, proof: Proof): Finding[] {
	return piece.scores
		.filter(({ from, at }) => at >= piece[across(from)])
		.map(({ from, at }) => {
			const side = piece[across(from)];
			return {
				line: lineOf(piece),
				rule: 'score-outside',
				severity: 'mend',
				message: `A score at ${proof.say(at)} from the ${from} misses “${piece.name}”, which is ${proof.say(side)} ${across(from) === 'w' ? 'wide' : 'high'}.`,
				mend: { text: `Score it at less than ${proof.say(side)}, or make the piece larger.` }
			};
		});
}

function scoresTwice(piece: Piece, proof: Proof): Finding[] {
	const seen = new Set<string>();
	return piece.scores.flatMap(({ from, at }, index): Finding[] => {
		const axis = across(from);
		const place = `${axis}${from === 'left' || from === 'top' ? at : piece[axis] - at}`;
		const again = seen.has(place);
		seen.add(place);
		if (!again) return [];
		return [
			{
				line: lineOf(piece),
				rule: 'score-twice',
				severity: 'ask',
				message: `The score at ${proof.say(at)} from the ${from} of “${piece.name}” is already there, ${proof.say(piece[axis] - at)} from the ${OPPOSITE[from]}.`,
				mend: {
					text: 'Take one of the two out.',
					change: { path: proof.path(piece, 'scores'), value: scoresWithout(piece, index, proof) }
				}
			}
		];
	});
}

function scoresWithout(piece: Piece, index: number, proof: Proof) {
	return piece.scores
		.filter((_, nth) => nth !== index)
		.map((score) => ({ ...score, at: proof.type(score.at) }));
}

function diagonalsOutside(piece: Piece, proof: Proof): Finding[] {
	const outside = ({ x, y }: { x: number; y: number }) => x > piece.w || y > piece.h;
	return piece.diagonals.flatMap(({ from, to }): Finding[] => {
		const missing = [from, to].find(outside);
		if (missing) {
			return [
				{
					line: lineOf(piece),
					rule: 'diagonal-outside',
					severity: 'mend',
					message: `A diagonal cut of “${piece.name}” goes to ${proof.say(missing.x)} across and ${proof.say(missing.y)} down; the piece is ${proof.saySize(piece.w, piece.h)}.`,
					mend: { text: 'Begin and end it on the piece.' }
				}
			];
		}
		if (from.x !== to.x || from.y !== to.y) return [];
		return [
			{
				line: lineOf(piece),
				rule: 'diagonal-nowhere',
				severity: 'mend',
				message: `A diagonal cut of “${piece.name}” begins and ends at one point.`,
				mend: { text: 'Say where it ends, or take it out.' }
			}
		];
	});
}
