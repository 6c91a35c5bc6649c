import { shaped } from '$lib/domain/exchange/shape';
import { importSchema } from '$lib/schemas/exchange';
import { page } from '$lib/server/answer';
import { write } from '$lib/server/db/client';
import { Invalid } from '$lib/server/errors';
import { readable } from '$lib/server/readable';
import { importRoom, type ImportSummary } from '$lib/server/services/exchange';
import { requireActor } from '$lib/server/session';
import { fail } from '@sveltejs/kit';
import { v7 } from 'uuid';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = page(async (event) => {
	await requireActor(event, 'member');
	return { id: v7() };
});

export const actions: Actions = {
	default: page(async (event) => {
		const actor = await requireActor(event, 'member');
		const sent = await event.request.formData();
		try {
			const document = await readFile(sent.get('document'));
			const input = readable(() => shaped(importSchema, { id: sent.get('id'), document }));
			const summary = await write((tx) => importRoom(tx, actor, input));
			return { done: describe(summary) };
		} catch (refusal) {
			if (!(refusal instanceof Invalid)) throw refusal;
			const issues = refusal.issues.map(({ path, message }) => ({ at: path.join('/'), message }));
			return fail(422, { issues });
		}
	})
};

async function readFile(file: FormDataEntryValue | null): Promise<unknown> {
	if (!(file instanceof File) || file.size === 0) {
		throw new Invalid([{ path: [], message: 'Choose the document first.' }]);
	}
	try {
		return JSON.parse(await file.text());
	} catch {
		throw new Invalid([{ path: [], message: 'This file isn’t an exchange document: it isn’t JSON.' }]);
	}
}

/** What importing did, in sentences; nothing new is worth saying too. */
function describe({ supplies, projects }: ImportSummary): string[] {
	const say = (what: string, { added, changed, unchanged }: ImportSummary['supplies']) =>
		`${what}: ${added} added, ${changed} changed, ${unchanged} as they were.`;
	return [say('Supplies', supplies), say('Projects', projects)];
}
