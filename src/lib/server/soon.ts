import { setTimeout as pause } from 'node:timers/promises';

/** What a page can show at once, or what will reach it while it is read. */
export type Soon<T> =
	{ readonly ready: true; readonly value: T } | { readonly ready: false; readonly later: Promise<T> };

/** As long as nobody minds looking at nothing. */
const MOMENT_MS = 800;

/**
 * Waits a moment for work that is mostly quick; what takes longer is streamed to the page. `patient`: waits for
 * all of it, for a page without scripts.
 */
export async function soon<T>(work: Promise<T>, patient = false): Promise<Soon<T>> {
	const settled = work.then(
		() => true,
		() => true
	);
	const ready = patient || (await Promise.race([settled, pause(MOMENT_MS, false)]));
	return ready ? { ready, value: await work } : { ready, later: work };
}
