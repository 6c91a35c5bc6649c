import fc from 'fast-check';
import { v7 } from 'uuid';
import { describe, expect, it } from 'vitest';
import { padForm, padInput } from './pad-form';
import { designNames, namesIn } from './pad-names';
import { addPadSchema } from './supplies';

const id = v7();
const pad = { id, name: 'Hedge School', size: '12 x 12 in', sheets: 24, designs: 12 };
const refusals = (form: object) =>
	(padForm('in').safeParse({ ...pad, ...form }).error?.issues ?? []).map(({ path }) => path.join('.'));

describe('the pad form', () => {
	it('says what the service takes, whatever was left blank', () => {
		const form = padForm('in').parse({
			...pad,
			doubleSided: true,
			fronts: 'Acorn Spot\n\nBramble Rows\n',
			backs: 'Moss',
			frontDirection: 'one-way',
			price: '12.50'
		});
		const input = addPadSchema.parse(padInput(form));
		expect(input.described).toHaveLength(12);
		expect(input.described[0]).toEqual({
			front: 'Acorn Spot',
			frontDirection: 'one-way',
			back: 'Moss',
			backDirection: 'none'
		});
		expect(input.described[1]).toEqual({ frontDirection: 'one-way', backDirection: 'none' });
		expect(input.described[2]?.front).toBe('Bramble Rows');
		expect(input.price).toEqual({ amount: 1250, currency: 'USD' });
	});

	it('forgets the B-sides of a pad that is printed on one side', () => {
		const input = padInput(padForm('in').parse({ ...pad, backs: 'Moss' }));
		expect(input.described.some((design) => design.back !== undefined)).toBe(false);
	});

	it('puts each refusal beside its field', () => {
		expect(refusals({ name: ' ' })).toEqual(['name']);
		expect(refusals({ size: '12' })).toEqual(['size']);
		expect(refusals({ designs: 7 })).toEqual(['designs']);
		expect(refusals({ designs: 1, fronts: 'Acorn\nBramble' })).toEqual(['fronts']);
		expect(refusals({ weight: 'heavy' })).toEqual(['weight']);
		expect(refusals({ price: 'lots' })).toEqual(['price']);
		expect(refusals({ barcode: '9520000000013' })).toEqual(['barcode']);
	});
});

describe('names of a pad’s designs', () => {
	it('numbers those that nobody named, in their places', () => {
		expect(designNames('Acorn Spot\n\n Bramble Rows ', 4)).toEqual([
			'Acorn Spot',
			'Design 2',
			'Bramble Rows',
			'Design 4'
		]);
		expect(designNames('', 12)[1]).toBe('Design 02');
	});

	it('gives each design a name, whatever was pasted', () => {
		fc.assert(
			fc.property(fc.string(), fc.integer({ min: 1, max: 40 }), (list, designs) => {
				const names = designNames(list, designs);
				expect(names).toHaveLength(designs);
				expect(names.every((name) => name.trim() !== '')).toBe(true);
			})
		);
	});

	it('reads back a list of names as it was written', () => {
		const name = fc.stringMatching(/^[A-Za-z][A-Za-z ]{0,20}[a-z]$/);
		fc.assert(
			fc.property(fc.array(name), (names) => {
				expect(namesIn(names.join('\n'))).toEqual(names);
			})
		);
	});
});
