import { toast } from 'svelte-sonner';

/** Long enough to be read, reached and undone by keyboard. */
const STAYS = 12_000;

/** Says what was done. `undo` puts it back exactly as it was. */
export function say(message: string, undo?: () => void | Promise<void>) {
	toast(message, {
		duration: STAYS,
		action: undo && { label: 'Undo', onClick: () => void undo() }
	});
}

/** Says what didn't work and what to do next; stays until it is closed. */
export function sayProblem(message: string, retry?: () => void | Promise<void>) {
	toast.error(message, {
		duration: Infinity,
		action: retry && { label: 'Try again', onClick: () => void retry() }
	});
}
