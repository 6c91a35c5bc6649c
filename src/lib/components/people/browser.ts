const BROWSERS: readonly [RegExp, string][] = [
	[/Edg\//, 'Edge'],
	[/OPR\//, 'Opera'],
	[/Firefox\//, 'Firefox'],
	[/Chrome\//, 'Chrome'],
	[/Safari\//, 'Safari']
];
const MACHINES: readonly [RegExp, string][] = [
	[/iPhone/, 'an iPhone'],
	[/iPad/, 'an iPad'],
	[/Android/, 'an Android device'],
	[/Windows/, 'Windows'],
	[/Mac OS X/, 'a Mac'],
	[/CrOS/, 'a Chromebook'],
	[/Linux/, 'Linux']
];

/** What a person would call the browser behind a user-agent line. */
export function browserName(userAgent: string): string {
	const named = (list: typeof BROWSERS) => list.find(([pattern]) => pattern.test(userAgent))?.[1];
	const browser = named(BROWSERS) ?? 'A browser';
	const machine = named(MACHINES);
	return machine ? `${browser} on ${machine}` : browser;
}
