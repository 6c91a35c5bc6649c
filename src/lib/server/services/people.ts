import { eq } from 'drizzle-orm';
import { v7 } from 'uuid';
import type { Transaction } from '../db/client';
import { users, type SiteRole } from '../db/schema/people';
import { Conflict, NotFound } from '../errors';
import { alreadyKnown, confirmAddress, passwordChanged, resetLink, signInLink } from '../mail/letters';
import { findAccount } from '../queries/people';
import { oweLetter } from './outbox';
import { createRoom } from './rooms';
import { endSessions } from './sessions';
import { issueToken, useToken } from './tokens';

export interface SignUp {
	readonly name: string;
	readonly email: string;
	readonly passwordHash: string;
	readonly next: string;
}

/** Sends a confirmation, or says by letter that there is an account already: the asker sees no difference. */
export async function startSignUp(tx: Transaction, origin: string, signUp: SignUp): Promise<void> {
	const { email, ...rest } = signUp;
	const to = { to: email, origin };
	const letter = (await findAccount(tx, email))
		? alreadyKnown(to)
		: confirmAddress(to, await issueToken(tx, 'sign-up', email, rest));
	await oweLetter(tx, letter);
}

/**
 * Opens the account that a confirmation link stands for, with a room of its own unless an invitation is next.
 * @throws {NotFound | Conflict}
 */
export async function openAccount(
	tx: Transaction,
	secret: string
): Promise<{ userId: string; next: string }> {
	const { email, signUp } = await useToken(tx, 'sign-up', secret);
	if (!signUp) throw new NotFound();
	if (await findAccount(tx, email)) throw new Conflict('This address has an account by now: sign in.');
	const { name, passwordHash, next } = signUp;
	const userId = await addUser(tx, { name, email, passwordHash });
	if (!next.startsWith('/join/')) await createRoom(tx, userId, { id: v7(), name: `${name}’s room` });
	return { userId, next };
}

export async function addUser(
	tx: Transaction,
	person: { name: string; email: string; passwordHash: string | null }
): Promise<string> {
	const id = v7();
	await tx.insert(users).values({ id, ...person, createdAt: Date.now() });
	return id;
}

/** Mails a sign-in link, where there is such an account. */
export async function sendSignInLink(
	tx: Transaction,
	origin: string,
	email: string,
	next: string
): Promise<void> {
	const account = await findAccount(tx, email);
	if (!account || account.disabledAt) return;
	await oweLetter(tx, signInLink({ to: email, origin }, await issueToken(tx, 'link', email), next));
}

/** Mails a link to choose a new password, where there is such an account. */
export async function sendResetLink(tx: Transaction, origin: string, email: string): Promise<void> {
	const account = await findAccount(tx, email);
	if (!account || account.disabledAt) return;
	await oweLetter(tx, resetLink({ to: email, origin }, await issueToken(tx, 'reset', email)));
}

/** Whoever a mailed link signs in; it works once. @throws {NotFound} */
export async function redeemSignInLink(tx: Transaction, secret: string): Promise<string> {
	const { email } = await useToken(tx, 'link', secret);
	return (await accountOf(tx, email)).id;
}

/** Sets the password that a reset link was asked for, and ends every session. @throws {NotFound} */
export async function resetPassword(
	tx: Transaction,
	origin: string,
	secret: string,
	passwordHash: string
): Promise<string> {
	const { email } = await useToken(tx, 'reset', secret);
	const { id } = await accountOf(tx, email);
	await setPassword(tx, origin, { id, email }, passwordHash);
	await endSessions(tx, id);
	return email;
}

/** Sets a password, and ends the person's other sessions. */
export async function changePassword(
	tx: Transaction,
	origin: string,
	person: { id: string; email: string; sessionId: string },
	passwordHash: string
): Promise<void> {
	await setPassword(tx, origin, person, passwordHash);
	await endSessions(tx, person.id, person.sessionId);
}

export async function changeName(tx: Transaction, userId: string, name: string): Promise<void> {
	await tx.update(users).set({ name }).where(eq(users.id, userId));
}

/** Gives or takes a site-wide role; the person's sessions end, so that nothing runs on with the old one. */
export async function changeSiteRole(tx: Transaction, userId: string, siteRole: SiteRole): Promise<void> {
	await tx.update(users).set({ siteRole }).where(eq(users.id, userId));
	await endSessions(tx, userId);
}

export async function disableAccount(tx: Transaction, userId: string): Promise<void> {
	await tx.update(users).set({ disabledAt: Date.now() }).where(eq(users.id, userId));
	await endSessions(tx, userId);
}

async function setPassword(
	tx: Transaction,
	origin: string,
	person: { id: string; email: string },
	passwordHash: string
): Promise<void> {
	await tx.update(users).set({ passwordHash }).where(eq(users.id, person.id));
	await oweLetter(tx, passwordChanged({ to: person.email, origin }));
}

async function accountOf(tx: Transaction, email: string) {
	const account = await findAccount(tx, email);
	if (!account || account.disabledAt) throw new NotFound('This link no longer works.');
	return account;
}
