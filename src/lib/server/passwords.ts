import { hash, verify } from '@node-rs/argon2';
import { dictionary } from '@zxcvbn-ts/language-common';

/** argon2id (the library's default kind), 19 MiB and two passes, as OWASP's password storage sheet has it. */
const COST = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };
const AT_ONCE = 4;

const common = new Set(dictionary['passwords-common']);

/** Whether the password is one of the tens of thousands that are tried first. */
export function isCommonPassword(password: string): boolean {
	return common.has(password.toLowerCase());
}

export function hashPassword(password: string): Promise<string> {
	return inTurn(() => hash(password, COST));
}

let decoy: Promise<string> | undefined;

/** Takes as long for nobody's password (null) as for somebody's. */
export async function passwordFits(passwordHash: string | null, password: string): Promise<boolean> {
	decoy ??= hashPassword('no account has this one');
	const against = passwordHash ?? (await decoy);
	const fits = await inTurn(() => verify(against, password));
	return fits && passwordHash !== null;
}

let running = 0;
const waiting: (() => void)[] = [];

/** Hashing is heavy on purpose: a few at once, the rest wait, and the server stays answerable. */
async function inTurn<T>(work: () => Promise<T>): Promise<T> {
	if (running >= AT_ONCE) await new Promise<void>((resolve) => waiting.push(resolve));
	else running++;
	try {
		return await work();
	} finally {
		const next = waiting.shift();
		if (next) next();
		else running--;
	}
}
