import { v7 } from 'uuid';
import { describe, expect, it } from 'vitest';
import { readSupply } from '../domain/exchange';
import { filledForm, supplyDocument, supplyForm } from './supply-form';

const id = v7();
const parse = (form: object) => supplyForm('in').safeParse({ id, ...form });
const refusals = (form: object) =>
	(parse(form).error?.issues ?? []).map(({ path, message }) => [path.join('.'), message]);

describe('the supply form', () => {
	it.each([
		{
			key: 'fern',
			kind: 'patterned-paper',
			name: 'Fern',
			size: '12 x 12 1/4 in',
			sheets: 2,
			count: 'unsure',
			faces: [{ design: 'Fern', direction: 'one-way' }],
			weight: '65 lb cover',
			colours: ['#6d8a5f', '#fbf6ea'],
			price: { amount: 95, currency: 'USD' },
			brandingStrip: { edge: 'bottom', depth: '1/4 in' }
		},
		{ key: 'tape', kind: 'tape', name: 'Tape', width: '1/4 in', left: '98 in', full: '27 yd', bin: 'Tray 3' },
		{
			key: 'glue',
			kind: 'glue',
			name: 'Glue',
			left: '40 ml',
			full: '4 fl oz',
			price: { amount: 650, currency: 'CAD' }
		},
		{
			...{ key: 'brads', kind: 'brads', name: 'Brads', left: 0, full: 100 },
			price: { amount: 12_345, currency: 'JPY' }
		},
		{
			key: 'punch',
			kind: 'corner-punch',
			name: 'Punch',
			shape: 'wave',
			size: '1/2 in',
			cuts: ['paper'],
			borrowedUntil: '2027-05-10'
		}
	])('says of $key what it was filled with', (document) => {
		const supply = readSupply(document, 'in');
		const form = supplyForm('in').parse(filledForm(id, 3, supply, 'EUR'));
		expect(readSupply(supplyDocument(form), 'in')).toEqual(supply);
	});

	it('puts each refusal beside its field', () => {
		expect(refusals({ kind: 'cardstock', name: 'Oat', size: '12' })).toEqual([['size', expect.any(String)]]);
		expect(refusals({ kind: 'cardstock', name: '', size: '12 x 12' })).toEqual([
			['name', expect.any(String)]
		]);
		expect(refusals({ kind: 'brads', name: 'Brads', left: 'some' })).toEqual([['left', expect.any(String)]]);
		expect(refusals({ kind: 'tape', name: 'Tape', left: '1 in', price: 'lots' })).toEqual([
			['price', expect.any(String)]
		]);
		expect(refusals({ kind: 'corner-punch', name: 'Punch', toolSize: '0.33 in' })).toEqual([
			['toolSize', expect.any(String)]
		]);
	});

	it('drops what isn’t of its kind', () => {
		const form = supplyForm('in').parse({
			id,
			kind: 'scissors',
			name: 'Scissors',
			left: '98 in',
			size: 'odd'
		});
		expect(supplyDocument(form)).toEqual({ key: 'scissors', kind: 'scissors', name: 'Scissors' });
	});
});
