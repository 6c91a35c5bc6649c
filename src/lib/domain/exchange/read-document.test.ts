import { describe, expect, it } from 'vitest';
import { INCH } from '../length';
import { readDocument, readMatchRequest } from './read-document';
import { Unreadable, type Issue } from './unreadable';

/** The document that the exchange form is described by, as its author wrote it. */
const DESCRIBED = String.raw`
{
  "format": "paperlarder", "version": 1,
  "supplies": [
    { "key": "fern", "kind": "patterned-paper", "name": "Fern Lattice", "collection": "Hedge School",
      "size": "12 x 12 in", "sheets": 2, "count": "counted",            // or "unsure"
      "faces": [{ "design": "Fern Lattice", "direction": "one-way" },   // none | one-way | two-way
                { "design": "Oat", "direction": "none" }],
      "weight": "180 gsm",                                              // or "65 lb cover"
      "colours": ["#6d8a5f"], "price": { "amount": 95, "currency": "USD" },
      "barcode": "9520000000110", "bin": "Tray 3" },
    { "key": "oc1", "kind": "cardstock", "name": "Oat offcut", "size": "4 1/4 x 11 in", "sheets": 1, "offcut": true },
    { "key": "strip", "kind": "patterned-paper", "name": "Kite Row", "size": "12 x 12 1/4 in", "sheets": 1,
      "brandingStrip": { "edge": "bottom", "depth": "1/4 in" } },
    { "key": "qt", "kind": "tape", "name": "Quarter-inch tape", "width": "1/4 in", "left": "98 in", "full": "27 yd" },
    { "key": "rn", "kind": "runner", "name": "Tape runner", "left": "8 m" },
    { "key": "tr", "kind": "trimmer", "name": "Desk trimmer", "reach": "12 in", "cuts": ["paper"] },
    { "key": "sb", "kind": "scoring-board", "name": "Scoring board", "reach": "12 in", "grooves": "1/8 in" },
    { "key": "cp", "kind": "corner-punch", "name": "Wave corner", "shape": "wave", "borrowedUntil": "2027-05-10" },
    { "key": "kn", "kind": "craft-knife", "name": "Board knife", "lentUntil": "2027-05-12", "cuts": ["paper", "board"] },
    { "key": "kr", "kind": "cardstock", "name": "Kraft", "size": "8 1/2 x 11 in", "sheets": 25, "arrives": "2027-05-20" }
  ],
  "projects": [
    { "key": "tagbook", "name": "Tag book",
      "measures": { "tagW": "2 3/8 in" },                               // optional; pieces may use them
      "slots": [
        { "key": "cover", "material": { "kind": "patterned-paper" }, "designs": "one",
          "design": "Fern Lattice" },                                   // optional: the paper chosen for this slot
        { "key": "tags", "material": { "kind": "patterned-paper", "weight": { "min": "120 gsm" } },
          "designs": "one", "sameAs": "cover",                          // or "differentFrom": ["cover"]
          "swaps": [{ "kind": "cardstock" }] } ],
      "pieces": [
        { "key": "c", "slot": "cover", "w": "11 in", "h": "7 in", "qty": 1, "up": "h",   // h | w | none
          "scores": [{ "from": "left", "at": "5 1/2 in", "fold": "valley" }] },
        { "key": "t", "slot": "tags", "w": "=tagW", "h": "4 in", "qty": 6, "up": "h", "allowance": "1/16 in",
          "corners": [{ "at": ["top-left", "top-right"], "tool": "punch" }] } ],
      "adhesives": [{ "key": "rim", "kind": "tape", "width": "1/4 in", "need": "93 in",
                      "swaps": [{ "kind": "tape", "width": "1/8 in", "times": 2 }] }],
      "tools": [{ "key": "punch", "kind": "corner-punch", "shape": "wave", "swaps": [{ "kind": "corner-punch" }] },
                { "key": "trim", "kind": "trimmer", "reach": "11 in" }] } ]
}
`;
const described = () => JSON.parse(DESCRIBED.replace(/\s\/\/ ?.*$/gm, ''));

function issuesOf(read: () => unknown): readonly Issue[] {
	try {
		read();
	} catch (trouble) {
		if (trouble instanceof Unreadable) return trouble.issues;
		throw trouble;
	}
	return [];
}

describe('the exchange document', () => {
	it('reads as described', () => {
		const { supplies, bills } = readDocument(described(), 'in');
		expect(supplies.map(({ key }) => key).join(' ')).toBe('fern oc1 strip qt rn tr sb cp kn kr');
		expect(supplies[0]).toEqual({
			group: 'sheet',
			key: 'fern',
			kind: 'patterned-paper',
			name: 'Fern Lattice',
			collection: 'Hedge School',
			w: 97536,
			h: 97536,
			unit: 'in',
			sheets: 2,
			count: 'counted',
			faces: [
				{ design: 'Fern Lattice', direction: 'one-way' },
				{ design: 'Oat', direction: 'none' }
			],
			weight: { text: '180 gsm', gsm: 180 },
			caliper: null,
			colours: ['#6d8a5f'],
			offcut: false,
			strip: null,
			price: { amount: 95, currency: 'USD' },
			barcode: '9520000000110',
			bin: 'Tray 3',
			arrives: null
		});
		expect(supplies[3]).toMatchObject({
			group: 'consumable',
			width: 2032,
			left: 796544,
			full: 27 * 36 * INCH
		});
		expect(supplies[4]).toMatchObject({ left: 8 * 320_000, unit: 'm' });
		const [tagbook] = bills;
		expect(tagbook?.measures).toEqual({ tagW: 19304 });
		expect(tagbook?.unusedMeasures).toBeUndefined();
		expect(tagbook?.pieces[1]).toMatchObject({ w: 19304, h: 32512, qty: 6, up: 'h', allowance: 508 });
		expect(tagbook?.slots[0]).toMatchObject({ designs: 'one', design: 'Fern Lattice' });
		expect(tagbook?.adhesives[0]).toMatchObject({ need: 755904, swaps: [{ width: 1016, times: 2 }] });
	});

	it('reads from its text, and says where the text is no JSON', () => {
		expect(readDocument(JSON.stringify(described()), 'mm').bills).toHaveLength(1);
		expect(issuesOf(() => readDocument('{ "format":', 'in'))).toEqual([
			{ path: '', message: 'This isn’t JSON. An exchange document is exported as a .json file.' }
		]);
	});
});
