import { listed } from '$lib/components/supply/listed';
import { measureOf } from '$lib/components/supply/kinds';
import { amountTyped } from '$lib/schemas/stock-form';
import {
	lendSchema,
	moveSchema,
	recountSchema,
	trashSchema,
	undoSchema,
	useSchema
} from '$lib/schemas/supplies';
import { page } from '$lib/server/answer';
import { today } from '$lib/server/clock';
import { reader, write } from '$lib/server/db/client';
import { Conflict, Invalid } from '$lib/server/errors';
import { doneAct } from '$lib/server/queries/acts';
import { storedSupply } from '$lib/server/queries/stash';
import { listBins, supplyById } from '$lib/server/queries/supplies';
import { undo } from '$lib/server/services/ledger';
import {
	lendTool,
	moveSupplies,
	recount,
	restoreSupplies,
	trashSupplies,
	useSupply
} from '$lib/server/services/stock';
import type { Transaction } from '$lib/server/db/client';
import { requireActor, type Actor } from '$lib/server/session';
import { fail, redirect, type RequestEvent } from '@sveltejs/kit';
import { v7 } from 'uuid';
import type { z } from 'zod';
import type { Actions, PageServerLoad, RouteParams } from './$types';

export const load: PageServerLoad = page(async (event) => {
	const actor = await requireActor(event, 'viewer');
	const [{ ledger, ...supply }, bins, done] = await Promise.all([
		supplyById(reader, actor, event.params.id),
		listBins(reader, actor),
		doneAct(reader, actor, event.url.searchParams.get('did'))
	]);
	return {
		supply: { ...supply, picture: supply.picture !== null },
		due: listed(supply, today()).arrives,
		ledger,
		bins: bins.map(({ name }) => name),
		writes: actor.role !== 'viewer',
		request: v7(),
		done
	};
});

export const actions: Actions = {
	/** Some of it came or went, or it was counted. */
	book: act('book', async (event, fields, actor) => {
		const { kind } = await storedSupply(reader, actor, event.params.id);
		const amount = amountTyped(String(fields.get('amount') ?? ''), measureOf(kind));
		const said = { id: fields.get('id'), why: fields.get('why') || undefined };
		if (fields.get('what') !== 'counted') {
			const use = useSchema.safeParse({
				...said,
				supply: event.params.id,
				kind: fields.get('what'),
				amount
			});
			return doing(use, useSupply);
		}
		const count = fields.has('unsure') ? 'unsure' : 'counted';
		const counts = [{ supply: event.params.id, left: amount, count }];
		return doing(recountSchema.safeParse({ ...said, counts }), recount);
	}),

	move: act('move', (event, fields) => {
		const bin = String(fields.get('bin') ?? '').trim() || null;
		const move = { id: fields.get('id'), supplies: [event.params.id], bin };
		return doing(moveSchema.safeParse(move), moveSupplies);
	}),

	lend: act('lend', (event, fields) => {
		const why = fields.get('why') || undefined;
		const lend = { id: fields.get('id'), supply: event.params.id, until: fields.get('until'), why };
		return doing(lendSchema.safeParse(lend), lendTool);
	}),

	takeBack: act('lend', (event, fields) => {
		const back = { id: fields.get('id'), supply: event.params.id, until: null };
		return doing(lendSchema.safeParse(back), lendTool);
	}),

	undo: act('undo', (_event, fields) =>
		doing(undoSchema.safeParse({ id: fields.get('id'), act: fields.get('act') }), undo)
	),

	restore: act('restore', (event, fields) =>
		doing(trashSchema.safeParse({ id: fields.get('id'), supplies: [event.params.id] }), restoreSupplies)
	),

	trash: act(
		'trash',
		(event, fields) =>
			doing(trashSchema.safeParse({ id: fields.get('id'), supplies: [event.params.id] }), trashSupplies),
		() => '/supplies'
	)
};

type SupplyEvent = RequestEvent<RouteParams>;
interface Doing {
	readonly id: string;
	readonly run: (tx: Transaction, actor: Actor) => Promise<unknown>;
}

/**
 * An action that is one act of the ledger. What can't be read or done is said beside its form (`which`), with what
 * was typed; what is done is told where it leads.
 */
function act(
	which: string,
	read: (event: SupplyEvent, fields: FormData, actor: Actor) => Doing | Promise<Doing>,
	after = (event: SupplyEvent) => event.url.pathname
) {
	return page(async (event: SupplyEvent) => {
		const actor = await requireActor(event, 'member');
		const fields = await event.request.formData();
		try {
			const { id, run } = await read(event, fields, actor);
			await write((tx) => run(tx, actor));
			redirect(303, `${after(event)}?did=${id}`);
		} catch (refusal) {
			if (!(refusal instanceof Invalid || refusal instanceof Conflict)) throw refusal;
			const typed = Object.fromEntries([...fields].map(([name, value]) => [name, String(value)]));
			return fail(refusal.status, { which, refused: refusal.message, typed });
		}
	});
}

/** The service's work on an input that its schema has read. @throws {Invalid} */
function doing<Input extends { id: string }>(
	read: z.ZodSafeParseResult<Input>,
	service: (tx: Transaction, actor: Actor, input: Input) => Promise<unknown>
): Doing {
	if (!read.success) {
		throw new Invalid(
			read.error.issues.map(({ path, message }) => ({
				path: path.map((part) => (typeof part === 'symbol' ? '' : part)),
				message
			}))
		);
	}
	return { id: read.data.id, run: (tx, actor) => service(tx, actor, read.data) };
}
