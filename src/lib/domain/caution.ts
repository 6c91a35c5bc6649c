import type { Bill } from './bill/bill';
import type { ConsumableKind, ToolKind } from './stash';

/** Stands above any list of cautions: what is said here never comes before these. */
export const CAUTION_DEFERENCE =
	'These are the usual cautions. The maker’s label and instructions come first, then your local codes and licensed practice.';

/** What everybody at the bench is usually told. No signal words: those grade a danger, and that is the maker’s to do. */
const CAUTIONS = {
	trimmer: {
		title: 'A trimmer’s blade',
		text: 'Stand it on a steady, flat table. Leave the guard on and keep hands and fingers behind it. One person cuts at a time, and no more sheets at once than the maker says. Put the arm down and latch it after every cut; never carry it by the arm.'
	},
	knife: {
		title: 'An open blade',
		text: 'Cut on a mat larger than the cut, along a safety ruler, away from your body, with the hand that holds the sheet behind the blade. Change a dull blade: it needs more force. Cap or retract it when you put it down; old blades go in a sharps container. Follow the maker’s instructions for changing blades.'
	},
	point: {
		title: 'A sharp point',
		text: 'Pierce and set on a firm mat with nothing of yours behind the paper, and keep fingers out of the way of the stroke. Cover the point when you put it down. Follow the maker’s instructions.'
	},
	press: {
		title: 'Rollers and presses',
		text: 'Keep fingers, hair, sleeves and cords clear of where it closes, and use only the plates and thickness that the maker’s instructions give.'
	},
	'hot-air': {
		title: 'Hot air',
		text: 'Treat the nozzle like an open flame: the jet can’t be seen, and the nozzle stays hot after it is switched off. Keep it away from paper that could scorch, never leave it alone while it is on, and rest it as the maker’s instructions say.'
	},
	'hot-glue': {
		title: 'Molten glue',
		text: 'Molten glue and the nozzle burn. Stand the gun on its rest over a drip mat, and air the room. Glue on skin: cool it at once under cold water for about ten minutes, don’t pull it off, and get medical help if it has burned. Follow the maker’s label.'
	},
	spray: {
		title: 'Spray',
		text: 'Spray where air moves freely, with the mask and eye protection that the label asks for, and nothing near that burns, glows or sparks. An empty can may still give off vapour. Read the maker’s label and safety data sheet first.'
	},
	vapour: {
		title: 'Glues and inks',
		text: 'Read the maker’s label before opening, and the safety data sheet where there is one: some give off vapour, some bond skin in seconds. Air the room, keep it closed and off skin and eyes, and keep flames away. If skin or eyes are bonded, don’t pull them apart; get medical help.'
	},
	'heat-and-vapour': {
		title: 'Heat beside vapour',
		text: 'Never use heat near an open glue, solvent or spray, or its rags and empty cans: a hot element or motor can set vapour alight. Let the work dry and the room air first, for as long as the maker’s label says.'
	},
	'small-parts': {
		title: 'Small parts',
		text: 'Keep small parts away from children under three, and from anyone who puts things in their mouth. If what you make is for a child, the rules for toys where you live and the maker’s label decide.'
	},
	magnets: {
		title: 'Loose magnets',
		text: 'Swallowed magnets can do grave harm: keep loose ones away from children, count them, and glue them in so that they can’t come out. If one may have been swallowed, get medical help at once. Keep them away from implanted medical devices, as the maker’s label says.'
	}
} as const;
export type CautionId = keyof typeof CAUTIONS;

export interface Caution {
	readonly id: CautionId;
	readonly title: string;
	readonly text: string;
	/** The bill's lines that need it, like `tools/knife` and `steps/3`; `plan` for the cut plan. */
	readonly lines: readonly string[];
}

/**
 * The cautions that a bill's tools, consumables and steps need, each once.
 * @param plan whether the cut plan has a cut that only a knife makes
 */
export function cautionsFor(bill: Bill, plan: { readonly byKnife: boolean } = { byKnife: false }): Caution[] {
	const lines = new Map<CautionId, Set<string>>();
	const note = (line: string, ids: Iterable<CautionId>) => {
		for (const id of ids) lines.set(id, (lines.get(id) ?? new Set()).add(line));
	};
	for (const tool of bill.tools) note(`tools/${tool.key}`, ofKinds(tool));
	for (const list of ['adhesives', 'extras'] as const) {
		for (const line of bill[list]) note(`${list}/${line.key}`, ofKinds(line));
	}
	bill.steps.forEach((step, index) => {
		const tools = bill.tools.filter(({ key }) => step.tools.includes(key));
		note(`steps/${index + 1}`, [...tools.flatMap(ofKinds), ...inWords(step.text)]);
	});
	if (plan.byKnife) note('plan', ['knife']);
	const cut = [...lines.keys()].some((id) => id === 'trimmer' || id === 'knife');
	if (!cut) for (const { key } of bill.pieces) note(`pieces/${key}`, ['trimmer', 'knife']);
	noteHeatBesideVapour(lines);
	return (Object.keys(CAUTIONS) as CautionId[])
		.filter((id) => lines.has(id))
		.map((id) => ({ id, ...CAUTIONS[id], lines: [...lines.get(id)!] }));
}

function noteHeatBesideVapour(lines: Map<CautionId, Set<string>>): void {
	const of = (...ids: CautionId[]) => ids.flatMap((id) => [...(lines.get(id) ?? [])]);
	const [hot, vapour] = [of('hot-air', 'hot-glue'), of('spray', 'vapour')];
	if (hot.length > 0 && vapour.length > 0) lines.set('heat-and-vapour', new Set([...hot, ...vapour]));
}

/** A line's own kind and those it may be swapped for: either may be what is in her hand. */
function ofKinds(line: {
	readonly kind: ToolKind | ConsumableKind;
	readonly swaps: readonly { readonly kind: ToolKind | ConsumableKind }[];
}): CautionId[] {
	return [line, ...line.swaps].flatMap(({ kind }) => BY_KIND[kind] ?? []);
}

const BY_KIND: Readonly<Partial<Record<ToolKind | ConsumableKind, readonly CautionId[]>>> = {
	trimmer: ['trimmer'],
	'guillotine-cutter': ['trimmer'],
	'rotary-cutter': ['knife'],
	'craft-knife': ['knife'],
	scissors: ['knife'],
	awl: ['point'],
	stapler: ['point'],
	'eyelet-setter': ['point'],
	'die-cutter': ['press'],
	'heat-tool': ['hot-air'],
	'glue-gun': ['hot-glue'],
	'spray-adhesive': ['spray'],
	glue: ['vapour'],
	ink: ['vapour'],
	magnets: ['magnets', 'small-parts'],
	brads: ['small-parts'],
	eyelets: ['small-parts'],
	rings: ['small-parts'],
	closures: ['small-parts'],
	embellishments: ['small-parts']
};

function inWords(text: string): CautionId[] {
	return SAID.filter(([words]) => words.test(text)).map(([, id]) => id);
}

/** What a step says without naming a tool. */
const SAID: readonly (readonly [RegExp, CautionId])[] = [
	[/\b(?:guillotine|trimmer)\b/i, 'trimmer'],
	[/\b(?:kni(?:fe|ves)|scalpel|blades?|rotary cutter)\b/i, 'knife'],
	[/\b(?:awl|needles?|pierc\w*|stapl\w*|eyelet setter)\b/i, 'point'],
	[/\bdie[- ]cut(?:ter|ting)?\b/i, 'press'],
	[/\b(?:heat (?:gun|tool)|hot air|heat[- ](?:set|emboss)\w*|embossing powder)\b/i, 'hot-air'],
	[/\b(?:hot[- ]?(?:melt )?glue|glue gun|hot-melt)\b/i, 'hot-glue'],
	[/\b(?:spray\w*|aerosol)\b/i, 'spray'],
	[/\b(?:solvents?|super ?glue|cyanoacrylate|contact cement|varnish|alcohol inks?)\b/i, 'vapour'],
	[/\bmagnets?\b/i, 'magnets'],
	[/\b(?:brads?|eyelets?|beads?|gems?|sequins?)\b/i, 'small-parts']
];
