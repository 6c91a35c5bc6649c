import { tapeForPiece } from '../../bench';
import { SUPPLY_MEASURES } from '../../stash';
import { lineOf, names, type Finding, type Proof } from './finding';

/** The tape that the taped edges add up to, against the tape that is listed; and glue for what is glued. */
export function tapeFindings(proof: Proof): Finding[] {
	const lines = [...new Set(proof.bill.pieces.flatMap(({ tape }) => tape?.line ?? []))];
	return [...lines.flatMap((line) => onLine(line, proof)), ...nothingSticks(proof)];
}

function onLine(key: string, proof: Proof): Finding[] {
	const { adhesives } = proof.bill;
	const pieces = proof.bill.pieces.filter(({ tape }) => tape?.line === key);
	const edges = pieces.reduce(
		(sum, piece) => sum + tapeForPiece(piece, [...new Set(piece.tape?.edges)], piece.qty),
		0
	);
	const index = adhesives.findIndex((line) => line.key === key);
	const line = adhesives[index];
	if (!line) {
		return [
			{
				line: lineOf(pieces[0]!),
				rule: 'tape-not-listed',
				severity: 'mend',
				message: `Taped edges of ${names(pieces)} add up to ${proof.say(edges)} of “${key}”, which isn’t among the adhesives.`,
				mend: {
					text: `List ${proof.say(edges)} of tape.`,
					change: {
						path: `adhesives.${adhesives.length}`,
						value: { key, kind: 'tape', need: proof.type(edges) }
					}
				}
			}
		];
	}
	if (SUPPLY_MEASURES[line.kind] !== 'length') {
		return [
			{
				line: `adhesives/${key}`,
				rule: 'tape-not-by-length',
				severity: 'ask',
				message: `Edges are taped with “${line.name}”, which is listed as ${line.kind.replaceAll('-', ' ')} and doesn’t come by length.`,
				mend: { text: `List ${proof.say(edges)} of tape for them.` }
			}
		];
	}
	if (line.need >= edges) return [];
	return [
		{
			line: `adhesives/${key}`,
			rule: 'tape-too-little',
			severity: 'mend',
			message: `The edges taped with “${line.name}” add up to ${proof.say(edges)}; the bill lists ${proof.say(line.need)}.`,
			mend: {
				text: `List ${proof.say(edges)}.`,
				change: { path: `adhesives.${index}.need`, value: proof.type(edges) }
			}
		}
	];
}

function nothingSticks({ bill }: Proof): Finding[] {
	const glued = bill.pieces.find((piece) => piece.mount !== null || piece.wraps !== null);
	if (!glued || bill.adhesives.length > 0 || bill.pieces.some(({ tape }) => tape !== null)) return [];
	return [
		{
			line: lineOf(glued),
			rule: 'adhesive-not-listed',
			severity: 'ask',
			message: `“${glued.name}” is glued on, and no adhesive is listed.`,
			mend: { text: 'List the tape or glue that you use, and how much.' }
		}
	];
}
