import { describe, expect, it } from 'vitest';
import { answerMatch } from './match';

const never = () => () => false;
const document = {
	projects: [
		{
			key: 'tagbook',
			name: 'Tag book',
			slots: [{ key: 'tags', material: { kind: 'patterned-paper' } }],
			pieces: [{ key: 't', slot: 'tags', w: '2 3/8 in', h: '4 in', qty: 6 }]
		}
	],
	supplies: [{ key: 'fern', kind: 'patterned-paper', name: 'Fern', size: '12 x 12 in', sheets: 1 }]
};

describe('the match entry point', () => {
	it('answers a request as JSON decodes it, for the day of the asking', () => {
		const reply = answerMatch({ request: document, today: '2027-05-10' }, never);
		expect(reply).toMatchObject({
			ok: true,
			response: { unit: '1/320 mm', results: [{ project: 'tagbook', copies: 1, verdict: 'now' }] }
		});
	});

	it('answers a wrong document with its issues', () => {
		const reply = answerMatch({ request: { ...document, mode: 'all' }, today: '2027-05-10' }, never);
		expect(reply).toMatchObject({ ok: false, issues: [{ path: 'mode' }] });
	});

	it('never says short when its time is over before it began', () => {
		const reply = answerMatch({ request: document, today: '2027-05-10' }, () => () => true);
		expect(reply).toMatchObject({
			ok: true,
			response: {
				results: [{ verdict: 'look', lines: [{ why: 'no plan found in the time given' }], plan: null }]
			}
		});
	});
});
