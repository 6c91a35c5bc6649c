import { beforeAll, describe, expect, it } from 'vitest';
import { exampleRequest } from '../factories/worked-example';
import { ask, servedDatabase } from './ask';

beforeAll(async () => {
	await servedDatabase();
});

const INCH = 8128;
const match = async (body: unknown, type?: string) => {
	const response = await ask('POST /api/match', null, { body, type });
	return { status: response.status, body: await response.json() };
};

describe('POST /api/match', () => {
	it('answers the documented example in full, to a visitor', async () => {
		const { status, body } = await match(exampleRequest());
		expect(status).toBe(200);
		expect(body).toMatchObject({
			unit: '1/320 mm',
			results: [
				{
					...{ project: 'tagbook', copies: 1, verdict: 'now', after: null, nowIfFirst: false },
					lines: [
						{ line: 'slots/cover', verdict: 'now', supplies: ['fern'], swap: null },
						{ line: 'slots/tags', verdict: 'now', supplies: ['fern'], swap: null },
						{ line: 'adhesives/rim', verdict: 'now', need: 755904, left: 796544, tight: true, swap: null },
						{ line: 'tools/punch', verdict: 'now', supplies: ['cp'], swap: null },
						{ line: 'tools/trim', verdict: 'now', supplies: ['tr'], swap: null }
					],
					short: [],
					near: [],
					plan: { proof: 'minimum' }
				}
			]
		});
		const { sheets } = body.results[0].plan;
		expect(sheets.map(({ supply, nth, w, h }: Sheet) => [supply, nth, w, h])).toEqual([
			['fern', 1, 97536, 97536],
			['fern', 2, 97536, 97536]
		]);
		const placed = sheets.flatMap(({ placements }: Sheet) => placements);
		expect(placed.filter(({ piece }: Placed) => piece === 'c')).toHaveLength(1);
		expect(placed.filter(({ piece }: Placed) => piece === 't')).toHaveLength(6);
		for (const { project, piece, w, h, turned, face } of placed as Placed[]) {
			const [asW, asH] = piece === 'c' ? [11, 7] : [2.375, 4];
			expect([project, w, h, turned, face]).toEqual(['tagbook', asW! * INCH, asH! * INCH, false, 'A']);
		}
		for (const { placements, cuts, offcuts, w, h } of sheets as Sheet[]) {
			const area = [...placements, ...offcuts].reduce((sum, rect) => sum + rect.w * rect.h, 0);
			expect(area).toBe(w * h);
			expect(cuts[0]!.of).toEqual({ x: 0, y: 0, w, h });
		}
	});

	it('says with one sheet that one tag and one 12 × 12 sheet are missing', async () => {
		const request = exampleRequest();
		Object.assign(request.supplies[0]!, { sheets: 1 });
		const { body } = await match(request);
		expect(body.results[0]).toMatchObject({
			verdict: 'short',
			short: [{ line: 'slots/tags', pieces: { t: 1 }, sheets: [{ w: 97536, h: 97536, count: 1 }] }]
		});
		expect(body.results[0].plan.sheets[0].placements).toHaveLength(6);
	});

	it('needs one sheet when the print may lie as it likes, with no slack across', async () => {
		const request = exampleRequest();
		Object.assign(request.projects[0]!.pieces[1]!, { up: 'none' });
		const { body } = await match(request);
		expect(body.results[0]).toMatchObject({ verdict: 'now', plan: { proof: 'minimum' } });
		expect(body.results[0].plan.sheets).toHaveLength(1);
		const across = body.results[0].plan.sheets[0].placements.filter(({ piece }: Placed) => piece === 't');
		expect(across.every(({ turned }: Placed) => turned)).toBe(true);
	});

	it('knows that the punch was to go back the day before', async () => {
		const { body } = await match({ ...exampleRequest(), on: '2027-05-11' });
		expect(body.results[0].lines).toContainEqual(
			expect.objectContaining({ line: 'tools/punch', verdict: expect.not.stringMatching('now') })
		);
	});

	it('refuses a wrong document with the path of every fault', async () => {
		const request = { ...exampleRequest(), colour: 'red' };
		Object.assign(request.projects[0]!.pieces[0]!, { w: '0.33 in' });
		expect(await match(request)).toMatchObject({ status: 422, body: { issues: [{ path: 'colour' }] } });
		const { colour: _colour, ...rest } = request;
		expect(await match(rest)).toMatchObject({
			status: 422,
			body: {
				message: expect.any(String),
				issues: [{ path: 'projects.0.pieces.0.w', message: expect.any(String) }]
			}
		});
	});

	it.each([
		['nothing', 'null', 422],
		['a list', '[]', 422],
		['half a document', '{"projects": [', 400],
		['a name of every object', '{"projects": [], "supplies": [], "__proto__": {"on": "2027-05-11"}}', 422],
		['a number too large to be one', '{"projects": [], "supplies": [], "budgetMs": 1e309}', 422],
		['a negative budget', '{"projects": [], "supplies": [], "budgetMs": -1}', 422]
	])('refuses %s', async (_, body, status) => {
		expect((await match(body)).status).toBe(status);
	});

	it('takes JSON only, and no more than 2 MB of it', async () => {
		expect((await match('projects=', 'application/x-www-form-urlencoded')).status).toBe(415);
		expect((await match({ ...exampleRequest(), padding: 'x'.repeat(2 * 1024 * 1024) })).status).toBe(413);
	});

	it('counts a longer budget than it gives as the longest', async () => {
		expect((await match({ projects: [], supplies: [], budgetMs: 3_600_000 })).status).toBe(200);
	});
});

interface Placed {
	project: string;
	piece: string;
	x: number;
	y: number;
	w: number;
	h: number;
	turned: boolean;
	face: string;
}
interface Sheet {
	supply: string;
	nth: number;
	w: number;
	h: number;
	placements: Placed[];
	cuts: { of: object }[];
	offcuts: { w: number; h: number }[];
}
