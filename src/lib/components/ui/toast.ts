import { toaster } from './toaster.svelte';

/** Long enough to be read, reached and undone by keyboard. */
const STAYS = 12_000;

/** Says what was done. `undo` puts it back exactly as it was. */
export async function say(message: string, undo?: () => void | Promise<void>) {
	const { toast } = await open();
	toast(message, {
		duration: STAYS,
		action: undo && { label: 'Undo', onClick: () => void undo() }
	});
}

/** Says what didn't work and what to do next; stays until it is closed. */
export async function sayProblem(message: string, retry?: () => void | Promise<void>) {
	const { toast } = await open();
	toast.error(message, {
		duration: Infinity,
		action: retry && { label: 'Try again', onClick: () => void retry() }
	});
}

/** Loaded with the first thing that is said, so that no page waits for it. */
function open() {
	toaster.wanted = true;
	return import('svelte-sonner');
}
