import { expect, test } from 'vitest';
import { firstTry, tryFields, trySchema } from './try';

function posted(sizes: readonly string[], units = 'in') {
	const form = new FormData();
	form.set('project', 'note-cards');
	form.set('units', units);
	for (const size of sizes) {
		form.append('kind', 'cardstock');
		form.append('size', size);
		form.append('sheets', '2');
		form.append('direction', 'none');
	}
	return trySchema.safeParse(tryFields(form));
}

test('the form as it is first shown can be sent as it stands', () => {
	for (const units of ['in', 'cm', 'mm'] as const) {
		expect(trySchema.safeParse(firstTry('lidded-box', units)).error).toBeUndefined();
	}
});

test('fields of one name become papers, a blank size leaving one out', () => {
	const read = posted(['8 1/2 x 11', '', '162 x 216 mm']);
	expect(read.data?.papers.map(({ size, sheets }) => [size, sheets])).toEqual([
		['8 1/2 x 11', 2],
		['', 2],
		['162 x 216 mm', 2]
	]);
});

test('a size that can’t be read is refused beside its own field', () => {
	const issues = posted(['8 1/2 x 11', '12 x', '12 x 12']).error?.issues;
	expect(issues?.map(({ path }) => path.join('.'))).toEqual(['papers.1.size']);
});

test('a form with too few papers, or of no project, is refused', () => {
	expect(posted(['12 x 12']).success).toBe(false);
	expect(trySchema.safeParse({ ...firstTry('', 'in'), project: 'elsewhere' }).success).toBe(false);
});
