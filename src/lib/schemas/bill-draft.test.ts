import { describe, expect, it } from 'vitest';
import { billSchema, type BillDocument } from '../domain/exchange/bill-schema';
import { checkDraft } from './bill-check';
import { documentOf, draftFromForm, draftOf, type BillDraft } from './bill-draft';
import { editRows } from './bill-rows';
import { readFormTree, type Tree } from './form-tree';

const whole: BillDocument = {
	key: 'pocket',
	name: 'Pocket',
	units: 'in',
	measures: { boardH: '8 1/2 in', turnIn: '3/4' },
	slots: [
		{
			key: 'cover',
			name: 'Cover',
			material: { kind: 'patterned-paper', weight: { min: '120 gsm' }, caliper: { max: '0.4 mm' } },
			designs: 'mixed',
			colour: '#6d8a5f',
			swaps: [{ kind: 'cardstock', weight: { max: '300 gsm' } }]
		},
		{ key: 'board', material: { kind: 'chipboard' } },
		{
			key: 'liner',
			material: { kind: 'patterned-paper' },
			differentFrom: ['cover'],
			design: 'Fern',
			collection: 'Hedge'
		},
		{ key: 'tabs', material: { kind: 'patterned-paper' }, sameAs: 'cover' }
	],
	pieces: [
		{
			key: 'wrap',
			slot: 'cover',
			w: '10 3/4',
			h: '=boardH + 2 * turnIn',
			qty: 2,
			up: 'h',
			allowance: '1/16 in',
			scores: [{ from: 'left', at: '5 3/8', fold: 'mountain' }],
			corners: [{ at: ['top-left', 'top-right'], tool: 'punch' }],
			edges: [{ at: ['bottom'], tool: 'punch' }],
			diagonals: [{ from: { x: '0', y: '3/4' }, to: { x: '3/4', y: '0' } }],
			wraps: { boards: ['board', 'board'], gaps: ['1/4'], turnIn: '=turnIn', along: 'w' },
			tape: { line: 'rim', edges: ['top', 'left'] }
		},
		{ key: 'board', slot: 'board', name: 'Board', w: '4 1/2', h: '=boardH', qty: 2 },
		{ key: 'mat', slot: 'liner', w: '4 in', h: '8 in', mount: { on: 'board', border: '1/4 in' } }
	],
	adhesives: [
		{
			key: 'rim',
			kind: 'tape',
			width: '1/4 in',
			need: '90 in',
			swaps: [{ kind: 'tape', width: '1/8 in', times: 2 }]
		}
	],
	tools: [
		{
			key: 'punch',
			name: 'Punch',
			kind: 'corner-punch',
			shape: 'wave',
			size: '1 in',
			cuts: ['paper'],
			swaps: [{ kind: 'corner-punch', shape: 'round' }]
		},
		{ key: 'board', kind: 'scoring-board', reach: '12 in', grooves: '1/8 in' }
	],
	extras: [{ key: 'magnets', kind: 'magnets', need: 4 }],
	steps: [{ text: 'Cut.', tools: ['punch'], pieces: ['wrap'] }]
};

/** A form as the browser posts it. */
function posted(draft: BillDraft): FormData {
	const form = new FormData();
	const put = (path: string, part: Tree): void => {
		if (typeof part === 'string') return form.set(path, part);
		if (Array.isArray(part) && part.every((one) => typeof one === 'string') && !path.endsWith('gaps'))
			return part.forEach((one) => form.append(`${path}[]`, one));
		for (const [name, inner] of Object.entries(part)) put(path ? `${path}.${name}` : name, inner);
	};
	put('', draft);
	return form;
}

describe('a bill as a form', () => {
	it('comes back from draft, form and draft again word for word', () => {
		expect(billSchema.parse(whole)).toEqual(whole);
		const draft = draftOf(whole);
		expect(documentOf(draft)).toEqual(whole);
		expect(draftFromForm(readFormTree(posted(draft)))).toEqual(draft);
		expect(checkDraft(draft, 'in').issues).toEqual({});
	});

	it('names an issue by the field that it stands in, and keeps what was typed', () => {
		const draft = draftOf(whole);
		draft.pieces[2]!.w = '4..5';
		draft.pieces[1]!.qty = 'two';
		const fields = () => Object.keys(checkDraft(draft, 'in').issues).sort();
		expect(fields()).toEqual(['pieces.1.qty', 'pieces.2.w']);
		draft.measures[1]!.value = '0';
		expect(fields()).toEqual(['measures.1.value', 'pieces.1.qty']);
		draft.pieces[1]!.qty = '2';
		expect(fields()).toEqual(expect.arrayContaining(['measures.1.value', 'pieces.2.w']));
		expect(documentOf(draft)).toMatchObject({ pieces: [{}, {}, { w: '4..5' }] });
	});

	it('refuses a measure without a name, and two of one name', () => {
		const draft = draftOf(whole);
		draft.measures.push({ name: '', value: '2 in' }, { name: 'boardH', value: '2 in' });
		const { issues, findings } = checkDraft(draft, 'in');
		expect(issues['measures.2.name']).toBeTruthy();
		expect(issues['measures.3.name']).toContain('already');
		expect(findings).toEqual([]);
	});

	it('draws what can be read while the rest is being typed', () => {
		const draft = draftOf(whole);
		draft.pieces[1]!.w = '';
		draft.pieces[0]!.scores[0]!.at = '5 3/';
		const { sketches } = checkDraft(draft, 'in');
		expect(sketches[0]).toMatchObject({ w: 10.75 * 8128, h: 10 * 8128, scores: [] });
		expect(sketches[1]).toBeNull();
	});

	it('reads no form into anything but its own fields', () => {
		const form = new FormData();
		form.set('__proto__.polluted', 'yes');
		form.set('constructor.prototype.polluted', 'yes');
		form.set('pieces.7.w', '2 in');
		form.set('pieces.2.w', '1 in');
		form.set('pieces.2.w.deeper', 'no');
		form.set('a.b.c.d.e.f.g.h.i', 'too deep');
		const draft = draftFromForm(readFormTree(form));
		expect(draft.pieces.map(({ w }) => w)).toEqual(['1 in', '2 in']);
		expect(({} as Record<string, unknown>)['polluted']).toBeUndefined();
	});
});

describe('row buttons', () => {
	it('add a row with a key that is free, and say where to go on typing', () => {
		const draft = draftOf(whole);
		expect(editRows(draft, 'add pieces')?.path).toBe('pieces.3');
		expect(editRows(draft, 'add pieces')?.path).toBe('pieces.4');
		const keys = draft.pieces.map(({ key }) => key);
		expect(new Set(keys).size).toBe(keys.length);
		expect(draft.pieces[3]).toMatchObject({ slot: 'tabs', qty: '1' });
		expect(editRows(draft, 'add pieces.3.scores')?.path).toBe('pieces.3.scores.0');
	});

	it('move and remove rows, and leave the ends alone', () => {
		const draft = draftOf(whole);
		expect(editRows(draft, 'up pieces.0')).toBeNull();
		expect(editRows(draft, 'down pieces.2')).toBeNull();
		editRows(draft, 'up pieces.2');
		editRows(draft, 'remove pieces.0');
		expect(draft.pieces.map(({ key }) => key)).toEqual(['mat', 'board']);
	});

	it('put a mend where the proofreader says, a new line included', () => {
		const draft = draftOf(whole);
		editRows(draft, `mend ${JSON.stringify({ path: 'pieces.2.w', value: '3 3/4 in' })}`);
		editRows(draft, `mend ${JSON.stringify({ path: 'tools.2', value: { key: 'awl', kind: 'awl' } })}`);
		expect(draft.pieces[2]!.w).toBe('3 3/4 in');
		expect(draft.tools[2]).toMatchObject({ key: 'awl', kind: 'awl', reach: '' });
	});

	it('do nothing where they ask for what isn’t there', () => {
		const draft = draftOf(whole);
		for (const asked of [
			'',
			'remove name',
			'remove pieces.9',
			'add name',
			'add __proto__',
			'mend {',
			'mend {}'
		])
			expect(editRows(draft, asked), asked).toBeNull();
		expect(editRows(draft, 'mend {"path":"pieces.9.w","value":"1"}')).toBeNull();
		expect(draft).toEqual(draftOf(whole));
	});
});
