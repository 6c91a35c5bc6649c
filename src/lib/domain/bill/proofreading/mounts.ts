import { INCH, type Length } from '../../length';
import type { Piece } from '../bill';
import { lineOf, type Finding, type Proof } from './finding';

/** Pieces that are glued onto others: do they sit within them, does the border show evenly, are there enough. */
export function mountFindings(proof: Proof): Finding[] {
	return proof.bill.pieces.flatMap((piece) => {
		const base = piece.mount && proof.piece(piece.mount.on);
		if (!piece.mount || !base) return [];
		return [...sitting(piece, base, piece.mount.border, proof), ...enough(piece, base, proof)];
	});
}

interface Panel {
	readonly w: Length;
	readonly h: Length;
}

/** One finding at most: too big, else not the border that is asked for, else a mat that shows unevenly. */
function sitting(piece: Piece, base: Piece, border: Length | null, proof: Proof): Finding[] {
	const panels = panelsOf(base);
	if (!panels.some((panel) => fits(piece, panel) || fits(turned(piece), panel)))
		return [tooBig(piece, base, proof)];
	if (border !== null) {
		const asked = panels.some((panel) => shows(piece, panel, border) || shows(turned(piece), panel, border));
		return asked ? [] : [otherBorder(piece, nearestPanel(piece, panels), border, proof)];
	}
	const panel = nearestPanel(piece, panels);
	const uneven = !panels.some((one) => even(piece, one) || even(turned(piece), one));
	return uneven && looksLikeMat(piece, panel) ? [unevenMat(piece, panel, proof)] : [];
}

/** The whole base and, where it is scored, each panel between its scores. */
function panelsOf({ w, h, scores }: Piece): Panel[] {
	const across = scores.flatMap(({ from, at }) =>
		from === 'left' ? [at] : from === 'right' ? [w - at] : []
	);
	const down = scores.flatMap(({ from, at }) => (from === 'top' ? [at] : from === 'bottom' ? [h - at] : []));
	const panels = between(w, across).flatMap((width) =>
		between(h, down).map((height) => ({ w: width, h: height }))
	);
	return [{ w, h }, ...panels];
}

function between(side: Length, scores: readonly Length[]): Length[] {
	const lines = [0, ...scores.filter((at) => at > 0 && at < side).sort((a, b) => a - b), side];
	return lines.slice(1).map((line, index) => line - lines[index]!);
}

const turned = ({ w, h }: Panel): Panel => ({ w: h, h: w });
const fits = (piece: Panel, panel: Panel) => piece.w <= panel.w && piece.h <= panel.h;
const even = (piece: Panel, panel: Panel) => fits(piece, panel) && panel.w - piece.w === panel.h - piece.h;
const shows = (piece: Panel, panel: Panel, border: Length) =>
	panel.w - piece.w === 2 * border && panel.h - piece.h === 2 * border;

/** The panel that the piece fills best, as the piece lies. */
function nearestPanel(piece: Piece, panels: readonly Panel[]): Panel {
	const lying = panels.filter((panel) => fits(piece, panel));
	const able = lying.length > 0 ? lying : panels.map(turned).filter((panel) => fits(piece, panel));
	return able.reduce((best, panel) => (panel.w * panel.h < best.w * best.h ? panel : best));
}

/** A border of up to half an inch on all four sides is a mat's; anything else was put where it is on purpose. */
function looksLikeMat(piece: Piece, panel: Panel): boolean {
	const [sides, ends] = [panel.w - piece.w, panel.h - piece.h];
	return sides > 0 && ends > 0 && Math.max(sides, ends) <= INCH;
}

function tooBig(piece: Piece, base: Piece, proof: Proof): Finding {
	return {
		line: lineOf(piece),
		rule: 'mount-too-big',
		severity: 'mend',
		message: `“${piece.name}” is ${proof.saySize(piece.w, piece.h)} and can’t sit within “${base.name}”, which is ${proof.saySize(base.w, base.h)}.`,
		mend: cutTo(piece, base, piece.mount?.border ?? null, proof)
	};
}

/** One change is proposed, to the first side that is wrong: the other is said once that is mended. */
function cutTo(piece: Piece, panel: Panel, border: Length | null, proof: Proof): Finding['mend'] {
	const to =
		border === null
			? { w: Math.min(piece.w, panel.w), h: Math.min(piece.h, panel.h) }
			: { w: panel.w - 2 * border, h: panel.h - 2 * border };
	if (to.w <= 0 || to.h <= 0) return { text: 'Check the border: it leaves nothing of the piece.' };
	const side = piece.w === to.w ? 'h' : 'w';
	return {
		text: `Cut “${piece.name}” ${proof.saySize(to.w, to.h)}.`,
		change: { path: proof.path(piece, side), value: proof.type(to[side]) }
	};
}

function otherBorder(piece: Piece, panel: Panel, border: Length, proof: Proof): Finding {
	return {
		line: lineOf(piece),
		rule: 'mat-border',
		severity: 'mend',
		message: `“${piece.name}” should show ${proof.say(border)} all round; ${shown(piece, panel, proof)}.`,
		mend: cutTo(piece, panel, border, proof)
	};
}

function unevenMat(piece: Piece, panel: Panel, proof: Proof): Finding {
	const both = Math.min(panel.w - piece.w, panel.h - piece.h);
	const side = panel.w - piece.w === both ? 'h' : 'w';
	const to = (side === 'h' ? panel.h : panel.w) - both;
	return {
		line: lineOf(piece),
		rule: 'mat-uneven',
		severity: 'ask',
		message: `A mat shows the same border on every side, but here ${shown(piece, panel, proof)}.`,
		mend: {
			text: `Make it ${side === 'h' ? `${proof.say(to)} high` : `${proof.say(to)} wide`}, and ${proof.sayHalf(both)} shows all round.`,
			change: { path: proof.path(piece, side), value: proof.type(to) }
		}
	};
}

function shown(piece: Piece, panel: Panel, proof: Proof): string {
	return `${proof.sayHalf(panel.w - piece.w)} shows left and right, ${proof.sayHalf(panel.h - piece.h)} above and below`;
}

function enough(piece: Piece, base: Piece, proof: Proof): Finding[] {
	if (piece.qty % base.qty === 0) return [];
	return [
		{
			line: lineOf(piece),
			rule: 'count-differs',
			severity: 'ask',
			message: `There are ${piece.qty} of “${piece.name}” for ${base.qty} of “${base.name}”.`,
			mend: {
				text: `Cut ${base.qty}, one for each.`,
				change: { path: proof.path(piece, 'qty'), value: base.qty }
			}
		}
	];
}
