import { and, eq, gt, isNull, lt } from 'drizzle-orm';
import type { Reader, Transaction } from '../db/client';
import { tokens, type TokenPurpose } from '../db/schema/people';
import { NotFound } from '../errors';
import { LIFETIME_MS } from '../lifetimes';
import { hashSecret, newSecret } from '../secrets';

export type Token = typeof tokens.$inferSelect;

/** Makes a mailed link's token; an earlier one for the same purpose and address no longer works. */
export async function issueToken(
	tx: Transaction,
	purpose: TokenPurpose,
	email: string,
	signUp: Token['signUp'] = null
): Promise<string> {
	const secret = newSecret();
	const now = Date.now();
	await tx.delete(tokens).where(lt(tokens.expiresAt, now));
	await tx.delete(tokens).where(and(eq(tokens.email, email), eq(tokens.purpose, purpose)));
	await tx.insert(tokens).values({
		hash: hashSecret(secret),
		purpose,
		email,
		signUp,
		createdAt: now,
		expiresAt: now + LIFETIME_MS[purpose]
	});
	return secret;
}

/** The token behind a link that would still work. @throws {NotFound} */
export async function findToken(db: Reader, purpose: TokenPurpose, secret: string): Promise<Token> {
	const [token] = await db
		.select()
		.from(tokens)
		.where(
			and(
				eq(tokens.hash, hashSecret(secret)),
				eq(tokens.purpose, purpose),
				isNull(tokens.usedAt),
				gt(tokens.expiresAt, Date.now())
			)
		);
	if (!token) throw new NotFound('This link has been used, replaced by a newer one, or has run out.');
	return token;
}

/** Uses a token up. @throws {NotFound} where it no longer works */
export async function useToken(tx: Transaction, purpose: TokenPurpose, secret: string): Promise<Token> {
	const token = await findToken(tx, purpose, secret);
	await tx.update(tokens).set({ usedAt: Date.now(), signUp: null }).where(eq(tokens.hash, token.hash));
	return token;
}
