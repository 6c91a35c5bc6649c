import { setImmediate as turn } from 'node:timers/promises';

/**
 * Does many things in lots of a size that a statement can bind, and lets other requests have their turn in
 * between: the embedded database answers without ever giving the event loop back.
 */
export async function inLots<T>(
	items: readonly T[],
	size: number,
	work: (lot: T[]) => Promise<unknown>
): Promise<void> {
	for (let start = 0; start < items.length; start += size) {
		if (start > 0) await turn();
		await work(items.slice(start, start + size));
	}
}
