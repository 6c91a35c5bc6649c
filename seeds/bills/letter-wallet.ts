import type { BillDocument } from '../../src/lib/domain/exchange/bill-schema';

/** A wallet for letters from one sheet of the same print that the gatefolds want: there is only one. */
export const letterWallet: BillDocument = {
	key: 'letter-wallet',
	name: 'Harbour letter wallet',
	measures: { closed: '4 3/4 in', flap: '2 in', side: '1/2 in' },
	slots: [
		{
			key: 'outside',
			name: 'Outside',
			material: { kind: 'patterned-paper' },
			design: 'Harbour Hand',
			collection: 'Salt Ledger'
		},
		{ key: 'inside', name: 'Inside', material: { kind: 'vellum', weight: { max: '120 gsm' } } }
	],
	pieces: [
		{
			key: 'outside',
			slot: 'outside',
			name: 'Wallet',
			w: '8 1/2 in',
			h: '=2 * closed + flap',
			qty: 1,
			up: 'h',
			scores: [
				{ from: 'left', at: '=side', fold: 'valley' },
				{ from: 'right', at: '=side', fold: 'valley' },
				{ from: 'top', at: '=flap', fold: 'valley' },
				{ from: 'bottom', at: '=closed', fold: 'valley' }
			]
		},
		{ key: 'inside', slot: 'inside', name: 'Divider', w: '7 1/4 in', h: '4 1/2 in', qty: 2 }
	],
	adhesives: [{ key: 'sides', name: 'Side flaps', kind: 'tape', width: '1/8 in', need: '10 in' }],
	tools: [
		{ key: 'trim', name: 'Trimmer', kind: 'trimmer', reach: '12 in' },
		{ key: 'score', name: 'Scoring board', kind: 'scoring-board', reach: '11 1/2 in' }
	],
	extras: [{ key: 'close', name: 'Closure', kind: 'closures', need: 1 }],
	steps: [
		{
			text: 'Cut the wallet and dividers; score half an inch in from both sides, two from the top and 4¾ from the bottom.',
			tools: ['trim', 'score'],
			pieces: ['outside', 'inside']
		},
		{
			text: 'Fold up the bottom, tape its side flaps inside, slip in the dividers and fit the closure to the flap.',
			pieces: ['outside', 'inside']
		}
	]
};
