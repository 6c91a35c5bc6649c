import type { Database } from '../db/client';
import { TooMany } from '../errors';
import { log } from '../log';
import { passwordFits } from '../passwords';
import { findAccount } from '../queries/people';
import { countPassword, forgivePassword, WAIT } from './attempts';

/**
 * Whose account this is, or null: for a wrong password, an unknown address and a disabled account alike, after
 * the same work. Hashing is slow, so it holds no transaction.
 * @throws {TooMany} throttled
 */
export async function checkPassword(
	{ reader, write }: Pick<Database, 'reader' | 'write'>,
	email: string,
	password: string,
	network: string
): Promise<string | null> {
	const attempt = await write((tx) => countPassword(tx, email, network));
	const account = await findAccount(reader, email);
	const usable = account?.disabledAt ? null : account?.passwordHash;
	const fits = await passwordFits(usable ?? null, password);
	if (!account || !fits) {
		log.warn({ network, account: account?.id }, 'sign-in.wrong');
		if (attempt.wary) throw new TooMany(900, WAIT);
		return null;
	}
	await write((tx) => forgivePassword(tx, email, network));
	return account.id;
}
