import { z } from 'zod';
import { parseWeight } from '../domain/paper-weight';
import { parseSize } from '../domain/length';
import { parseMoney } from '../domain/money';
import { readBarcode } from '../domain/gtin';
import { SHEET_KINDS } from '../domain/stash';
import { namesIn } from './pad-names';
import type { RoomUnits } from './rooms';
import { idField, type AddPad } from './supplies';

const text = z.string().max(120).default('');
const direction = z.enum(['none', 'one-way', 'two-way']).default('none');

const fields = z.object({
	id: idField,
	name: z.string().trim().min(1, 'Give the pad a name.').max(120),
	kind: z.enum(SHEET_KINDS).default('patterned-paper'),
	size: text,
	sheets: z.int('Count the sheets: a whole number.').min(1).max(1000).default(24),
	designs: z.int('Count the designs: a whole number.').min(1).max(200).default(12),
	doubleSided: z.boolean().default(false),
	/** One name a line, in the pad's order; a blank line leaves that design numbered. */
	fronts: z.string().max(30_000).default(''),
	backs: z.string().max(30_000).default(''),
	frontDirection: direction,
	backDirection: direction,
	weight: text,
	/** Of the whole pad. */
	price: text,
	currency: z.string().length(3).default('USD'),
	barcode: text,
	bin: text
});

export type PadForm = z.output<typeof fields>;

/** The form that enters a pad; a bare number in it is in the room's unit. */
export function padForm(units: RoomUnits) {
	return fields.superRefine((form, context) => {
		const refuse = (path: keyof PadForm, message: string) =>
			context.addIssue({ code: 'custom', path: [path], message });
		const read = {
			size: parseSize(form.size, { unit: units }),
			...(form.weight.trim() !== '' && { weight: parseWeight(form.weight) }),
			...(form.price.trim() !== '' && { price: parseMoney(form.price, form.currency) }),
			...(form.barcode.trim() !== '' && { barcode: readBarcode(form.barcode) })
		};
		for (const [path, { ok, ...answer }] of Object.entries(read)) {
			if (!ok && 'reason' in answer) refuse(path as keyof PadForm, answer.reason);
		}
		if (form.sheets % form.designs !== 0) {
			refuse('designs', 'The sheets don’t share out evenly among that many designs.');
		}
		for (const path of ['fronts', 'backs'] as const) {
			if (namesIn(form[path]).length > form.designs) refuse(path, 'More names than the pad has designs.');
			if (namesIn(form[path]).some((name) => name.length > 120))
				refuse(path, 'A name has at most 120 letters.');
		}
	});
}

/** What the form says, as the service takes it. */
export function padInput(form: PadForm): AddPad {
	const { id, name, kind, size, sheets, designs, doubleSided, frontDirection, backDirection } = form;
	const fronts = namesIn(form.fronts);
	const backs = doubleSided ? namesIn(form.backs) : [];
	const price = form.price.trim() === '' ? null : parseMoney(form.price, form.currency);
	return {
		...{ id, name, kind, size, sheets, designs, doubleSided },
		described: Array.from({ length: designs }, (_, nth) => ({
			...{ frontDirection, backDirection },
			...(fronts[nth] && { front: fronts[nth] }),
			...(backs[nth] && { back: backs[nth] })
		})),
		...(form.weight.trim() !== '' && { weight: form.weight }),
		...(price?.ok && { price: price.value }),
		...(form.barcode.trim() !== '' && { barcode: form.barcode }),
		...(form.bin.trim() !== '' && { bin: form.bin })
	};
}
