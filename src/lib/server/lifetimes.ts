const MINUTE_MS = 60_000;
const DAY_MS = 24 * 60 * MINUTE_MS;

export const LIFETIME_MS = {
	/** A session nobody uses. */
	idle: 14 * DAY_MS,
	/** A session, however busy. */
	session: 90 * DAY_MS,
	'sign-up': DAY_MS,
	link: 10 * MINUTE_MS,
	reset: 30 * MINUTE_MS,
	invitation: 7 * DAY_MS
} as const;
