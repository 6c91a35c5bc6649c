import { barcode, daysAfter, dollars, type Row } from './row';

export const consumables = (today: string): Row[] =>
	(
		[
			{
				key: 'tape-quarter',
				kind: 'tape',
				name: 'Quarter-inch tape',
				width: '1/4 in',
				left: '286 in',
				full: '27 yd',
				price: dollars(450),
				bin: 'Tape tin'
			},
			{
				key: 'tape-quarter-new',
				kind: 'tape',
				name: 'Quarter-inch tape, sealed',
				width: '1/4 in',
				left: '27 yd',
				full: '27 yd',
				price: dollars(450),
				arrives: daysAfter(today, 9)
			},
			{
				key: 'tape-eighth',
				kind: 'tape',
				name: 'Eighth-inch tape',
				width: '1/8 in',
				left: '21 yd',
				full: '27 yd',
				price: dollars(390),
				bin: 'Tape tin'
			},
			{
				key: 'tape-half',
				kind: 'tape',
				name: 'Half-inch tape',
				width: '1/2 in',
				left: '41 in',
				full: '15 yd',
				price: dollars(520),
				bin: 'Tape tin'
			},
			{
				key: 'tape-six',
				kind: 'tape',
				name: 'Six-millimetre tape',
				width: '6 mm',
				left: '9.5 m',
				full: '20 m',
				price: dollars(310),
				bin: 'Tape tin'
			},
			{
				key: 'foam-tape',
				kind: 'foam-tape',
				name: 'Foam tape',
				width: '1/4 in',
				left: '3 m',
				full: '5 m',
				price: dollars(380),
				bin: 'Tape tin'
			},
			{
				key: 'washi-ticking',
				kind: 'washi-tape',
				name: 'Ticking washi',
				width: '15 mm',
				left: '6 m',
				full: '10 m',
				price: dollars(280),
				bin: 'Tape tin'
			},
			{
				key: 'washi-plum',
				kind: 'washi-tape',
				name: 'Plum washi',
				width: '15 mm',
				left: '1.2 m',
				full: '10 m',
				count: 'unsure',
				price: dollars(280),
				bin: 'Tape tin'
			},
			{
				key: 'runner',
				kind: 'runner',
				name: 'Tape runner',
				left: '5 m',
				full: '8 m',
				price: dollars(340),
				bin: 'Tape tin'
			},
			{
				key: 'runner-refill',
				kind: 'runner',
				name: 'Tape runner refill',
				left: '8 m',
				full: '8 m',
				price: dollars(290),
				bin: 'Tape tin'
			},
			{
				key: 'ribbon-sage',
				kind: 'ribbon',
				name: 'Sage ribbon',
				width: '3/8 in',
				left: '2 1/2 yd',
				full: '10 yd',
				price: dollars(400),
				bin: 'Soft box'
			},
			{
				key: 'ribbon-damson',
				kind: 'ribbon',
				name: 'Damson velvet ribbon',
				width: '1/4 in',
				left: '18 in',
				full: '5 yd',
				price: dollars(520),
				bin: 'Soft box'
			},
			{
				key: 'elastic',
				kind: 'elastic',
				name: 'Flat elastic',
				width: '1/4 in',
				left: '2 m',
				full: '3 m',
				price: dollars(260),
				bin: 'Soft box'
			},
			{
				key: 'twine',
				kind: 'twine',
				name: 'Waxed linen twine',
				left: '14 yd',
				full: '50 yd',
				price: dollars(690),
				bin: 'Soft box'
			},
			{
				key: 'glue',
				kind: 'glue',
				name: 'Clear-drying glue',
				left: '62 ml',
				full: '118 ml',
				price: dollars(560),
				bin: 'Tape tin'
			},
			{
				key: 'paste',
				kind: 'glue',
				name: 'Bookbinding glue',
				left: '180 ml',
				full: '250 ml',
				count: 'unsure',
				price: dollars(980),
				bin: 'Tape tin'
			},
			{
				key: 'spray',
				kind: 'spray-adhesive',
				name: 'Mounting spray',
				left: '120 ml',
				full: '400 ml',
				count: 'unsure',
				price: dollars(1290),
				bin: 'Window sill'
			},
			{
				key: 'ink-soot',
				kind: 'ink',
				name: 'Soot pigment ink',
				left: '9 ml',
				full: '15 ml',
				price: dollars(450),
				bin: 'Stamp box'
			},
			{
				key: 'glue-stick',
				kind: 'glue-stick',
				name: 'Glue stick',
				left: 3,
				full: 4,
				price: dollars(480),
				bin: 'Tape tin'
			},
			{
				key: 'glue-dots',
				kind: 'glue-dots',
				name: 'Glue dots',
				left: 140,
				full: 200,
				price: dollars(360),
				bin: 'Tape tin'
			},
			{
				key: 'foam-squares',
				kind: 'foam-squares',
				name: 'Foam squares',
				left: 96,
				full: 252,
				price: dollars(330),
				bin: 'Tape tin'
			},
			{
				key: 'magnets',
				kind: 'magnets',
				name: 'Thin disc magnets',
				left: 6,
				full: 20,
				price: dollars(720),
				bin: 'Soft box'
			},
			{
				key: 'brads',
				kind: 'brads',
				name: 'Antique brads',
				left: 42,
				full: 100,
				price: dollars(390),
				bin: 'Stamp box'
			},
			{
				key: 'eyelets',
				kind: 'eyelets',
				name: 'Brass eyelets',
				left: 24,
				full: 60,
				price: dollars(410),
				bin: 'Stamp box'
			},
			{
				key: 'rings',
				kind: 'rings',
				name: 'Hinged book rings',
				left: 5,
				full: 12,
				price: dollars(430),
				bin: 'Stamp box'
			},
			{
				key: 'closures',
				kind: 'closures',
				name: 'Button-and-string closures',
				left: 2,
				full: 10,
				price: dollars(590),
				bin: 'Soft box'
			},
			{
				key: 'envelopes',
				kind: 'envelopes',
				name: 'Ready-made A2 envelopes',
				left: 18,
				full: 50,
				price: dollars(900),
				bin: 'Card shelf'
			},
			{
				key: 'pearls',
				kind: 'embellishments',
				name: 'Stick-on half pearls',
				left: 60,
				full: 120,
				price: dollars(290),
				bin: 'Stamp box'
			}
		] satisfies Row['supply'][]
	).map((supply, nth) => ({ supply: { ...supply, barcode: barcode(900 + nth) } }));
