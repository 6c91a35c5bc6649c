/** One thing wrong with a document: where, in dotted form (`projects.0.pieces.1.w`), and what to do about it. */
export interface Issue {
	readonly path: string;
	readonly message: string;
}

export type Path = readonly (string | number)[];

/** A document that can't be read, with everything that is wrong with it. */
export class Unreadable extends Error {
	constructor(readonly issues: readonly Issue[]) {
		super(issues.map(({ path, message }) => (path ? `${path}: ${message}` : message)).join('\n'));
		this.name = 'Unreadable';
	}
}
