import { createHash, randomBytes } from 'node:crypto';

/** A new unguessable word for a link or a cookie: 256 random bits. */
export function newSecret(): string {
	return randomBytes(32).toString('base64url');
}

/** What is kept of a secret. It is random already, so a plain hash is enough. */
export function hashSecret(secret: string): string {
	return createHash('sha256').update(secret).digest('base64url');
}
