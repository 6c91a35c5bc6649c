import { deserialize } from '$app/forms';
import { invalidateAll } from '$app/navigation';
import { say, sayProblem } from '$lib/components/ui/toast';
import { v7 } from 'uuid';

/** Takes an act back, and says so. A second try, after a lost answer, has no second effect. */
export async function undoAct(act: string, id = v7()): Promise<void> {
	const body = new FormData();
	body.set('act', act);
	body.set('id', id);
	try {
		const response = await fetch('/supplies?/undo', {
			method: 'POST',
			headers: { 'x-sveltekit-action': 'true' },
			body
		});
		const result = deserialize(await response.text());
		if (result.type === 'failure')
			return sayProblem(String(result.data?.refused ?? 'It couldn’t be undone.'));
		if (result.type === 'error') return sayProblem(String(result.error?.message ?? 'It couldn’t be undone.'));
		await invalidateAll();
		say('Put back as it was.');
	} catch {
		sayProblem('No answer from the server. Nothing was undone yet.', () => undoAct(act, id));
	}
}
