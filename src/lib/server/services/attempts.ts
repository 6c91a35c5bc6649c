import { and, count, eq, gt, lt, type SQL } from 'drizzle-orm';
import { v7 } from 'uuid';
import type { Transaction } from '../db/client';
import { attempts } from '../db/schema/people';
import { TooMany } from '../errors';
import { hashSecret } from '../secrets';

const MINUTE_MS = 60_000;
const WINDOW_MS = { password: 15 * MINUTE_MS, mail: 60 * MINUTE_MS } as const;
const KEEP_MS = 24 * 60 * MINUTE_MS;

const WRONG_PER_ACCOUNT = 10;
const WRONG_PER_NETWORK = 10;
/** NIST SP 800-63B-4 §3.2.2: no more than 100 wrong in a row on one account, from however many places. */
const WRONG_PER_ACCOUNT_ANYWHERE = 100;
const MAILS_PER_ACCOUNT = 5;
const MAILS_PER_NETWORK = 30;

type Kind = keyof typeof WINDOW_MS;

/** One try at something that is counted, by the address typed and the network it came from. */
export interface Attempt {
	readonly id: string;
	/** The account is under attack: a wrong answer must look the same as being refused. */
	readonly wary: boolean;
}

/**
 * Counts a password before it is looked at, so that guesses sent all at once are counted too.
 * Once an account has had ten wrong ones, only a network without a wrong one of its own may still try it: its
 * owner gets in from elsewhere, and the guesser doesn't learn whether a guess was even looked at.
 * @throws {TooMany}
 */
export async function countPassword(tx: Transaction, email: string, network: string): Promise<Attempt> {
	const account = hashSecret(email);
	await forgetOld(tx);
	const [anywhere, here] = [
		await recent(tx, 'password', eq(attempts.account, account)),
		await recent(tx, 'password', eq(attempts.network, network))
	];
	const wary = anywhere >= WRONG_PER_ACCOUNT;
	if (here >= WRONG_PER_NETWORK || (wary && here > 0) || anywhere >= WRONG_PER_ACCOUNT_ANYWHERE) {
		throw new TooMany(WINDOW_MS.password / 1000, WAIT);
	}
	return { id: await record(tx, 'password', account, network), wary };
}

/** The same words whether the account is throttled, the network is, or neither was looked at. */
export const WAIT =
	'Too many wrong passwords. Wait a quarter of an hour, or have a sign-in link sent to your address.';

/** A right password isn't a wrong one, and clears this person's own slips from this network. */
export async function forgivePassword(tx: Transaction, email: string, network: string): Promise<void> {
	await tx
		.delete(attempts)
		.where(
			and(
				eq(attempts.kind, 'password'),
				eq(attempts.account, hashSecret(email)),
				eq(attempts.network, network)
			)
		);
}

/**
 * Counts a letter asked for.
 * @returns false where this address has had enough of them, which the asker isn't told
 * @throws {TooMany} where the network asks for too many, to whatever addresses
 */
export async function countMail(tx: Transaction, email: string, network: string): Promise<boolean> {
	const account = hashSecret(email);
	await forgetOld(tx);
	if ((await recent(tx, 'mail', eq(attempts.network, network))) >= MAILS_PER_NETWORK) {
		throw new TooMany(WINDOW_MS.mail / 1000);
	}
	const allowed = (await recent(tx, 'mail', eq(attempts.account, account))) < MAILS_PER_ACCOUNT;
	await record(tx, 'mail', account, network);
	return allowed;
}

async function recent(tx: Transaction, kind: Kind, whose: SQL): Promise<number> {
	const since = Date.now() - WINDOW_MS[kind];
	const [row] = await tx
		.select({ n: count() })
		.from(attempts)
		.where(and(eq(attempts.kind, kind), whose, gt(attempts.at, since)));
	return row?.n ?? 0;
}

async function record(tx: Transaction, kind: Kind, account: string, network: string): Promise<string> {
	const id = v7();
	await tx.insert(attempts).values({ id, kind, account, network, at: Date.now() });
	return id;
}

async function forgetOld(tx: Transaction): Promise<void> {
	await tx.delete(attempts).where(lt(attempts.at, Date.now() - KEEP_MS));
}
