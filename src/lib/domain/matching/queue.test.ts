import { describe, expect, it } from 'vitest';
import { aBill, aPiece, aRequest, aSheet, aSlot, aTape, inches } from '../../../../tests/factories/stash';
import { matchProjects, mostAtOnce, unlocks, whatACutCosts } from './index';
import type { MatchRequest } from './request';

const budget = { work: 10_000_000 };
const piece = (key: string, w: number, h: number, qty = 1) =>
	aBill(key, { slots: [aSlot('s')], pieces: [aPiece('p', 's', w, h, { qty })] });
const queued = (some: Partial<MatchRequest>) =>
	matchProjects(aRequest({ mode: 'queue', ...some }), budget).results;

describe('a queue', () => {
	it('promises nothing twice and says what would be now if it went first', () => {
		const results = queued({ bills: [piece('a', 12, 7), piece('b', 12, 7)], supplies: [aSheet('fern')] });
		expect(results.map(({ verdict }) => verdict)).toEqual(['now', 'short']);
		expect(results[1]?.nowIfFirst).toBe(true);
	});

	it('shares a sheet, which stands whole in both plans', () => {
		const [a, b] = queued({ bills: [piece('a', 12, 5), piece('b', 12, 7)], supplies: [aSheet('fern')] });
		expect([a?.verdict, b?.verdict]).toEqual(['now', 'now']);
		expect(a?.plan?.sheets).toEqual(b?.plan?.sheets);
	});

	it('lays an earlier project out anew where a later one needs it', () => {
		const bills = [piece('a', 5, 5, 2), piece('b', 12, 7), piece('c', 2, 5)];
		const results = queued({ bills, supplies: [aSheet('fern')] });
		expect(results.map(({ verdict }) => verdict)).toEqual(['now', 'now', 'now']);
		expect(results[0]?.plan?.sheets[0]?.placements).toHaveLength(4);
	});

	it('draws what a short one can cut on whole sheets, with the cuts that free it', () => {
		const results = queued({ bills: [piece('a', 12, 5), piece('b', 12, 4, 2)], supplies: [aSheet('fern')] });
		expect(results.map(({ verdict }) => verdict)).toEqual(['now', 'short']);
		const [sheet] = results[1]?.plan?.sheets ?? [];
		expect(sheet?.cuts[0]?.of).toEqual({ x: 0, y: 0, w: inches(12), h: inches(12) });
		expect(sheet?.placements.map(({ project }) => project).sort()).toEqual(['a', 'b']);
	});

	it('reserves adhesive, and nothing for a project that is short', () => {
		const taped = (key: string, need: number) =>
			aBill(key, {
				adhesives: [{ key: 'rim', name: 'rim', kind: 'tape', width: null, need: inches(need), swaps: [] }]
			});
		const results = queued({
			bills: [taped('a', 60), taped('b', 60), taped('c', 40)],
			supplies: [aTape('roll')]
		});
		expect(results.map(({ verdict }) => verdict)).toEqual(['now', 'short', 'now']);
	});
});

describe('several projects', () => {
	it('counts the most that can be made at once', () => {
		const bills = [piece('whole', 12, 12), piece('a', 5, 5), piece('b', 12, 7)];
		expect(mostAtOnce(aRequest({ bills, supplies: [aSheet('fern')] }), budget)).toEqual({
			projects: ['a', 'b'],
			proved: true
		});
	});

	it('finds the purchase that makes most of them', () => {
		const request = aRequest({
			bills: [piece('a', 12, 12, 2), piece('b', 12, 7, 2), piece('c', 5, 5)],
			supplies: [aSheet('fern')]
		});
		const [best] = unlocks(request, matchProjects(request, budget), budget);
		expect(best).toMatchObject({ projects: ['a', 'b'], buy: { name: 'fern', sheets: 1 } });
	});

	it('says what a cut costs the others', () => {
		const faces = ['Fern', 'Oat'].map((design) => ({ design, direction: 'none' as const }));
		const chosen = (key: string, design: string) =>
			aBill(key, { slots: [aSlot('s', { design })], pieces: [aPiece('p', 's', 12, 7)] });
		const request = aRequest({
			bills: [chosen('a', 'Fern'), chosen('b', 'Fern'), chosen('c', 'Oat')],
			supplies: [aSheet('both', { faces })]
		});
		const plan = matchProjects(request, budget).results[0]?.plan;
		expect(plan && whatACutCosts(request, 'a', plan, budget)).toEqual([
			{ project: 'b', supply: 'both', loses: 'last-sheet', from: 'now', to: 'short' },
			{ project: 'c', supply: 'both', loses: 'other-face', from: 'now', to: 'short' }
		]);
	});
});
