/** The day of an instant, as a table says it: `12 Mar 2027`. In UTC, so that server and browser agree. */
export const dayMade = (at: number) =>
	new Intl.DateTimeFormat('en-GB', {
		day: 'numeric',
		month: 'short',
		year: 'numeric',
		timeZone: 'UTC'
	}).format(at);
