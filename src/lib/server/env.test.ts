import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { readEnv } from './env';

const AUTH_SECRET = 'kV3pQz8mT1yLrW6sXb0nJd5hGf2cAe9uKiOvRwEs';
const least = { ORIGIN: 'https://paper.test', AUTH_SECRET };
const sample = Object.fromEntries(
	[...readFileSync('.env.example', 'utf8').matchAll(/^([A-Z_]+)=(.*)$/gm)].map(([, name, value]) => [
		name,
		value
	])
);

describe('the settings', () => {
	it('have defaults for all but the address and the secret', () => {
		expect(readEnv(least)).toMatchObject({ PORT: 3000, RATE_LIMITS: true, DEMO: false });
		expect(readEnv({ ...least, DATA_DIR: '/srv/paper' }).DATABASE_URL).toBe('file:/srv/paper/paperlarder.db');
	});

	it('take a blank for a missing one', () => {
		expect(readEnv({ ...least, PORT: '', SMTP_URL: '', DATABASE_URL: '' }).PORT).toBe(3000);
	});

	it.each([
		[{ AUTH_SECRET: undefined }, /^AUTH_SECRET is missing/],
		[{ AUTH_SECRET: 'short' }, /AUTH_SECRET is too short/],
		[{ AUTH_SECRET: 'a'.repeat(60) }, /AUTH_SECRET is too plain/],
		[{ AUTH_SECRET: sample.AUTH_SECRET }, /still the sample/],
		[{ ORIGIN: undefined }, /^ORIGIN is missing/],
		[{ ORIGIN: 'paper.test' }, /^ORIGIN/],
		[{ DATABASE_URL: 'postgres://x' }, /^DATABASE_URL/],
		[{ SMTP_URL: 'http://x' }, /^SMTP_URL/],
		[{ RATE_LIMITS: 'no' }, /^RATE_LIMITS/],
		[{ PORT: 'x' }, /PORT/]
	])('are refused with a sentence: %o', (wrong, sentence) => {
		expect(() => readEnv({ ...least, ...wrong })).toThrow(sentence);
	});

	it('are all in .env.example, and it serves once it has a secret', () => {
		const optional = {
			SMTP_URL: 'smtp://127.0.0.1',
			ADMIN_EMAIL: 'a@paper.test',
			DATABASE_URL: 'file:x.db',
			DATABASE_AUTH_TOKEN: 'x'
		};
		const read = readEnv({ ...sample, ...optional, AUTH_SECRET });
		expect(readEnv({ ...sample, AUTH_SECRET })).toMatchObject({ ORIGIN: 'http://localhost:3000' });
		for (const name of Object.keys(read)) expect(sample).toHaveProperty(name);
	});
});
