import { and, asc, eq, lte } from 'drizzle-orm';
import { v7 } from 'uuid';
import type { Transaction } from '../db/client';
import { outbox } from '../db/schema/outbox';
import type { Letter } from '../mail/letters';

const FIRST_WAIT_MS = 5_000;
const LONGEST_WAIT_MS = 6 * 3_600_000;
const MOST_TRIES = 12;
/** A sender that dies with a letter in hand leaves it to be taken again after this long. */
const IN_HAND_MS = 120_000;

/** Owes a letter: call it in the transaction that makes it due. */
export async function oweLetter(tx: Transaction, letter: Letter): Promise<void> {
	const id = v7();
	const now = Date.now();
	await tx.insert(outbox).values({
		id,
		messageId: `<${id}@paperlarder>`,
		recipient: letter.to,
		subject: letter.subject,
		body: letter.body,
		createdAt: now,
		nextTryAt: now
	});
}

export type OwedLetter = typeof outbox.$inferSelect;

/** Takes the next letter that is due, so that no other process sends it meanwhile. */
export async function takeLetter(tx: Transaction): Promise<OwedLetter | undefined> {
	const now = Date.now();
	const [due] = await tx
		.select()
		.from(outbox)
		.where(lte(outbox.nextTryAt, now))
		.orderBy(asc(outbox.nextTryAt))
		.limit(1);
	if (!due) return undefined;
	const taken = { tries: due.tries + 1, nextTryAt: now + IN_HAND_MS };
	await tx.update(outbox).set(taken).where(eq(outbox.id, due.id));
	return { ...due, ...taken };
}

/** The letter's text goes once it is sent: it may hold a link that signs somebody in. */
export async function markSent(tx: Transaction, id: string): Promise<void> {
	await tx
		.update(outbox)
		.set({ sentAt: Date.now(), nextTryAt: null, lastError: null, body: '' })
		.where(eq(outbox.id, id));
}

/** Puts a letter back for later, or gives it up where trying again is no use. */
export async function markFailed(
	tx: Transaction,
	letter: OwedLetter,
	failure: { code: string; permanent: boolean }
): Promise<{ dead: boolean }> {
	const dead = failure.permanent || letter.tries >= MOST_TRIES;
	const wait = Math.min(FIRST_WAIT_MS * 2 ** (letter.tries - 1), LONGEST_WAIT_MS);
	await tx
		.update(outbox)
		.set(
			dead
				? { deadAt: Date.now(), nextTryAt: null, lastError: failure.code, body: '' }
				: { nextTryAt: Date.now() + wait, lastError: failure.code }
		)
		.where(and(eq(outbox.id, letter.id)));
	return { dead };
}
