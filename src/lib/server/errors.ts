/** One refused field: where it is in what was sent, and a sentence for the person. */
export interface Issue {
	readonly path: readonly (string | number)[];
	readonly message: string;
}

/** What a service or query may refuse with; `answer.ts` is the one place that turns these into responses. */
export abstract class Refusal extends Error {
	abstract readonly status: number;
}

export class Unauthenticated extends Refusal {
	readonly status = 401;
	constructor(message = 'Sign in first.') {
		super(message);
	}
}

export class Forbidden extends Refusal {
	readonly status = 403;
	constructor(message = 'Your role in this room doesn’t allow that.') {
		super(message);
	}
}

/** Also said of what exists in somebody else's room. */
export class NotFound extends Refusal {
	readonly status = 404;
	constructor(message = 'There is nothing here by that name.') {
		super(message);
	}
}

/** She is signed in, and in no room yet. */
export class NoRoom extends Refusal {
	readonly status = 409;
	constructor(message = 'Make a room first, or open an invitation to one.') {
		super(message);
	}
}

/** Somebody else got there first. Where an edit lost, `current` is what stands now, to be shown beside it. */
export class Conflict extends Refusal {
	readonly status = 409;
	constructor(
		message: string,
		readonly current?: unknown
	) {
		super(message);
	}
}

export class Invalid extends Refusal {
	readonly status = 422;
	constructor(
		readonly issues: readonly Issue[],
		message = issues[0]?.message ?? 'Something in there can’t be read.'
	) {
		super(message);
	}
}

/** What was sent can't be taken at all: 400 no JSON, 413 too large, 415 another type. */
export class Unacceptable extends Refusal {
	constructor(
		readonly status: 400 | 413 | 415,
		message: string
	) {
		super(message);
	}
}

export class Full extends Refusal {
	readonly status = 507;
	constructor(message = 'There is no room left on this server’s disk. Nothing was changed.') {
		super(message);
	}
}

export class TooMany extends Refusal {
	readonly status = 429;
	/** @param retryAfter whole seconds */
	constructor(
		readonly retryAfter: number,
		message = 'That was a lot at once. Wait a little and try again.'
	) {
		super(message);
	}
}

/**
 * The driver's code of a database error (`SQLITE_CONSTRAINT_UNIQUE`, …), or undefined for anything else.
 * The only part that may be logged: the text of a Drizzle error holds the bound values.
 */
export function databaseCode(error: unknown): string | undefined {
	for (let at = error; at instanceof Error; at = at.cause) {
		const { extendedCode, code } = at as { extendedCode?: unknown; code?: unknown };
		for (const name of [extendedCode, code]) {
			if (typeof name === 'string' && name.startsWith('SQLITE_')) return name;
		}
	}
	return undefined;
}
