import { describe, expect, it } from 'vitest';
import { hashPassword, passwordFits } from './passwords';

describe('a password', () => {
	it('is kept as argon2id at 19 MiB and two passes, salted', async () => {
		const [one, two] = await Promise.all([hashPassword('oat and fern'), hashPassword('oat and fern')]);
		expect(one).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
		expect(one).not.toBe(two);
	});

	it('fits only exactly, with hashes of many at once', async () => {
		const kept = await hashPassword(' oat ✂️ ');
		const tries = [' oat ✂️ ', 'oat ✂️', ' OAT ✂️ ', ' oat ✂️ '];
		expect(await Promise.all(tries.map((one) => passwordFits(kept, one)))).toEqual([
			true,
			false,
			false,
			true
		]);
		expect(await Promise.all(Array.from({ length: 12 }, () => passwordFits(kept, ' oat ✂️ ')))).toEqual(
			Array(12).fill(true)
		);
	});

	it('of nobody fits nothing', async () => {
		expect(await passwordFits(null, 'no account has this one')).toBe(false);
	});
});
