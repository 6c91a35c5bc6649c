import { describe, expect, it } from 'vitest';
import type { Bill } from '../../src/lib/domain/bill/bill';
import { cautionsFor } from '../../src/lib/domain/caution';
import { readBill } from '../../src/lib/domain/exchange';

const bill: Bill = readBill(
	{
		key: 'box',
		name: 'Gift box',
		slots: [{ key: 'paper', material: { kind: 'cardstock' } }],
		pieces: [{ key: 'lid', slot: 'paper', w: '4 in', h: '4 in' }],
		tools: ['trimmer', 'craft-knife', 'heat-tool', 'glue-gun'].map((kind) => ({ key: kind, kind })),
		adhesives: ['spray-adhesive', 'glue'].map((kind) => ({ key: kind, kind, need: '10 ml' })),
		extras: [{ key: 'brads', kind: 'brads', need: 4 }]
	},
	'in'
);
const text = (id: string) => cautionsFor(bill).find((caution) => caution.id === id)?.text;

describe('the usual cautions, as published', () => {
	it.each([
		// School district safety tip: paper cutter safety, 2018 (osdblog.osd.wednet.edu 2018/02/07)
		[
			'trimmer',
			/guard on/,
			/fingers behind/,
			/steady, flat/,
			/latch/,
			/never carry it by the arm/,
			/sheets at once/
		],
		// UK HSE booklet on guillotine safety, 1999, as quoted by answers.com: one operator at a time
		['trimmer', /One person cuts at a time/],
		// UK National Society for Education in Art and Design: H&S cutting tools, 2024 (nsead.org)
		[
			'knife',
			/mat larger than the cut/,
			/safety ruler/,
			/holds the sheet behind the blade/,
			/dull.*more force/
		],
		// Career-and-technical-education hand-out: craft knife safety, 2019 (vdocuments.site)
		['knife', /away from your body/, /Cap or retract/, /sharps container/],
		// Lab Manager: heat gun safety, 2010 (labmanager.com)
		['hot-air', /like an open flame/, /jet can’t be seen/],
		['heat-and-vapour', /Never use heat near an open glue, solvent or spray/],
		// Hot-melt glue safety advice, n.d. (gluegunsdirect.com/?p=5094)
		['hot-glue', /at once under cold water for about ten minutes/, /don’t pull it off/, /drip mat/, /rest/],
		// Spray adhesive: 8 safety tips, n.d. (doityourself.com)
		['spray', /air moves freely/, /mask/, /eye protection/, /burns, glows or sparks/],
		// Toolbox talk: petroleum-based adhesives, n.d. (ebrora.com TBT-COS-039)
		['heat-and-vapour', /rags and empty cans/],
		// Workshop manual: adhesives and sealers precautions, n.d. (fokuman.com, manualshive.com T7-140 p. 18)
		['vapour', /Air the room/, /flames away/, /safety data sheet/, /don’t pull them apart; get medical help/],
		// US CPSC: Art materials FAQ, small parts under three years (16 CFR 1501)
		['small-parts', /children under three/]
	] as [string, ...RegExp[]][])('%s', (id, ...said) => {
		for (const words of said) expect(text(id)).toMatch(words);
	});

	// CLP label elements; ANSI Z535.4-2007: the two systems' signal words aren't mixed, and here neither is used.
	it('use no signal word', () => {
		for (const caution of cautionsFor(bill)) {
			expect(`${caution.title} ${caution.text}`).not.toMatch(/\b(?:danger|warning|caution|notice)\b/i);
		}
	});
});
