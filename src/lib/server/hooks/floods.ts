import type { Handle } from '@sveltejs/kit';
import { refuse } from '../answer';
import { env } from '../env';
import { TooMany } from '../errors';
import { networkOf } from '../network';

/** A bucket of requests, refilled all the time; a person never meets its bottom. */
interface Allowance {
	readonly most: number;
	readonly perSecond: number;
}
const READS: Allowance = { most: 600, perSecond: 20 };
const WRITES: Allowance = { most: 120, perSecond: 2 };
const SWEEP_AT = 10_000;
const SWEEP_EVERY_S = 10;

interface Bucket {
	left: number;
	at: number;
}
const buckets = new Map<string, Bucket>();
let swept = 0;

/** Holds back whoever asks for far too much, by person where signed in, else by network. In memory, per process. */
export const floods: Handle = ({ event, resolve }) => {
	if (!env.RATE_LIMITS || event.isSubRequest) return resolve(event);
	const reading = event.request.method === 'GET' || event.request.method === 'HEAD';
	const allowance = reading ? READS : WRITES;
	const who = event.locals.user?.id ?? networkOf(event);
	const wait = take(`${reading ? 'read' : 'write'} ${who}`, allowance);
	return wait === 0 ? resolve(event) : refuse(new TooMany(wait));
};

/** @returns 0, or the whole seconds until there is something left */
function take(key: string, { most, perSecond }: Allowance): number {
	const now = performance.now() / 1000;
	const bucket = buckets.get(key) ?? { left: most, at: now };
	bucket.left = Math.min(most, bucket.left + (now - bucket.at) * perSecond);
	bucket.at = now;
	if (buckets.size >= SWEEP_AT && now - swept > SWEEP_EVERY_S) sweep(now);
	buckets.set(key, bucket);
	if (bucket.left < 1) return Math.ceil((1 - bucket.left) / perSecond);
	bucket.left -= 1;
	return 0;
}

/** A bucket untouched this long is full again, and so is a new one. */
function sweep(now: number): void {
	swept = now;
	for (const [key, { at }] of buckets) {
		if (now - at > 60) buckets.delete(key);
	}
}
