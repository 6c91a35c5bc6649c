import type { Done } from '$lib/server/queries/acts';

/** The notice's sentence for what was done. */
export function doneWords({ kind, rows, name }: Done): string {
	if (rows === 0 && kind !== 'undo') return 'That changed nothing: it was so already.';
	const what = rows === 1 && name ? name : `${rows} rows`;
	const are = rows === 1 ? 'is' : 'are';
	switch (kind) {
		case 'add':
			return `${what} ${are} in the stash.`;
		case 'edit':
			return `${what}: the changes are kept.`;
		case 'recount':
			return `${what} ${are} counted.`;
		case 'move':
			return `${what} ${rows === 1 ? 'has' : 'have'} been moved.`;
		case 'trash':
			return `${what} ${are} in the trash.`;
		case 'restore':
			return `${what} ${are} back in the stash.`;
		case 'use':
			return `${what}: noted in the ledger.`;
		case 'cut':
			return 'The sheets are cut, and their offcuts filed.';
		case 'import':
			return `${what} came in.`;
		case 'undo':
			return 'Put back as it was.';
	}
}

export const canUndo = ({ kind, rows, undone }: Done) =>
	rows > 0 && !undone && kind !== 'undo' && kind !== 'import';
