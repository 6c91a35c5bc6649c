import { z } from 'zod';

/** One plain address, compared in lower case. */
export const emailAddress = z
	.email('That doesn’t look like an e-mail address.')
	.max(254, 'That address is longer than an address can be.')
	.toLowerCase();

export const personName = z
	.string()
	.trim()
	.min(1, 'Say what to call you.')
	.max(80, 'Up to 80 letters, please.');

/** Any characters, spaces at the ends included; only too short and absurdly long are refused. */
export const newPassword = z
	.string()
	.min(8, 'At least 8 characters. A few words in a row make a good one.')
	.max(1000, 'Up to 1,000 characters, please.');

const typedPassword = z.string().min(1, 'Type your password.').max(1000, 'That isn’t your password.');

/** Where to go afterwards; checked by `returnPath`. */
const next = z.string().max(2000).default('');

export const signInSchema = z.object({ email: emailAddress, password: typedPassword, next });
export const signUpSchema = z.object({ name: personName, email: emailAddress, password: newPassword, next });
export const confirmSchema = z.object({ password: typedPassword });
export const mailLinkSchema = z.object({ email: emailAddress, next });
export const resetRequestSchema = z.object({ email: emailAddress });
export const resetSchema = z.object({ password: newPassword });
export const nameSchema = z.object({ name: personName });
export const passwordChangeSchema = z.object({ current: typedPassword, password: newPassword });
export const endSessionSchema = z.object({ session: z.uuid() });
