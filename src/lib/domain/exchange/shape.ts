import type { z } from 'zod';
import { Unreadable, type Issue, type Path } from './unreadable';

/**
 * Checks a document's shape before its lengths are read. Throws `Unreadable`.
 * @param under path of the part that is being checked
 */
export function shaped<Schema extends z.ZodType>(
	schema: Schema,
	json: unknown,
	under: Path = []
): z.output<Schema> {
	const reserved = reservedNames(json, [...under], 0);
	if (reserved.length > 0) throw new Unreadable(reserved);
	const read = schema.safeParse(json, { error: say });
	if (read.success) return read.data;
	throw new Unreadable(read.error.issues.flatMap((issue) => issuesOf(issue, under)).slice(0, MOST_ISSUES));
}

const MOST_ISSUES = 100;
const DEEPEST = 12;

/** `__proto__` is a key that a parser's copy would lose or obey: it is refused wherever it stands. */
function reservedNames(json: unknown, path: (string | number)[], depth: number): Issue[] {
	if (typeof json !== 'object' || json === null) return [];
	if (depth > DEEPEST)
		return [{ path: path.join('.'), message: 'This is nested deeper than any document goes.' }];
	const found: Issue[] = [];
	for (const [name, value] of Object.entries(json)) {
		const here = [...path, name];
		if (name === '__proto__') found.push({ path: here.join('.'), message: UNKNOWN });
		else if (typeof value === 'object') found.push(...reservedNames(value, here, depth + 1));
		if (found.length >= MOST_ISSUES) break;
	}
	return found;
}

const UNKNOWN = 'Nothing is called this here. Take it out, or check its spelling.';

function issuesOf(issue: z.core.$ZodIssue, under: Path): Issue[] {
	const path = [...under, ...issue.path.map(String)];
	if (issue.code === 'unrecognized_keys')
		return issue.keys
			.slice(0, MOST_ISSUES)
			.map((key) => ({ path: [...path, key.slice(0, 64)].join('.'), message: UNKNOWN }));
	if (issue.code === 'invalid_key') {
		const message = issue.issues[0]?.message ?? 'This name can’t be used.';
		return [{ path: path.map((part) => String(part).slice(0, 64)).join('.'), message }];
	}
	return [{ path: path.join('.'), message: issue.message }];
}

/** Zod's own words for what a schema did not word itself. */
function say(issue: z.core.$ZodRawIssue): string | undefined {
	switch (issue.code) {
		case 'invalid_type':
			return issue.input === undefined
				? 'This is missing.'
				: `This should be ${TYPES[issue.expected] ?? issue.expected}.`;
		case 'invalid_value':
			return `This should be ${oneOf(issue.values.map(String))}.`;
		case 'invalid_union':
			return issue.note === 'No matching discriminator'
				? 'This kind isn’t one that Paperlarder knows.'
				: 'This should be a length or volume as text, or a whole number.';
		case 'too_big':
			return issue.origin === 'string'
				? `This has at most ${issue.maximum} characters.`
				: issue.origin === 'array'
					? `This list has at most ${issue.maximum} entries.`
					: `This is at most ${issue.maximum}.`;
		case 'too_small':
			return issue.origin === 'array' ? 'This list is empty.' : `This is at least ${issue.minimum}.`;
	}
	return undefined;
}

const TYPES: Readonly<Record<string, string>> = {
	string: 'text, in quotation marks',
	int: 'a whole number',
	number: 'a whole number',
	boolean: 'true or false',
	array: 'a list',
	object: 'an object',
	record: 'an object'
};

function oneOf(values: readonly string[]): string {
	if (values.length === 1) return values[0]!;
	return `one of ${values.slice(0, -1).join(', ')} or ${values.at(-1)}`;
}
