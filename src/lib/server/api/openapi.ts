import { z } from 'zod';
import { billSchema, documentSchema, supplySchema } from '../../domain/exchange';
import { operations, type Operation } from './operations';

/** What `/api/openapi.json` answers: OpenAPI 3.1, from the very schemas that the handlers read by. */
export function describeApi(origin: string) {
	const all: [string, Operation][] = Object.entries(operations);
	const named = z.registry<{ id: string }>();
	named.add(supplySchema, { id: 'Supply' });
	named.add(billSchema, { id: 'Bill' });
	named.add(documentSchema, { id: 'ExchangeDocument' });
	for (const [name, { body }] of all) {
		if (body && !named.has(body)) named.add(body, { id: bodyName(name) });
	}
	const { schemas } = z.toJSONSchema(named, {
		io: 'input',
		unrepresentable: 'any',
		uri: (id) => `#/components/schemas/${id}`
	});
	return {
		openapi: '3.1.0',
		info: { title: 'Paperlarder', version: '1' },
		servers: [{ url: origin }],
		paths: paths(all, (body) => named.get(body)?.id ?? ''),
		components: {
			schemas: { ...plain(schemas), Refusal: REFUSAL },
			securitySchemes: { session: { type: 'apiKey', in: 'cookie', name: '__Host-paperlarder' } }
		}
	};
}

function paths(all: readonly [string, Operation][], nameOf: (body: z.ZodType) => string) {
	const paths: Record<string, Record<string, unknown>> = {};
	for (const [name, operation] of all) {
		const [method = '', path = ''] = name.split(' ');
		paths[path] = { ...paths[path], [method.toLowerCase()]: describe(path, operation, nameOf) };
	}
	return paths;
}

function describe(path: string, operation: Operation, nameOf: (body: z.ZodType) => string) {
	const { summary, access, body, status = 200 } = operation;
	const schema = body && { $ref: `#/components/schemas/${nameOf(body)}` };
	return {
		summary: access === 'open' ? summary : `${summary} For ${READERS[access]}.`,
		security: access === 'open' ? [] : [{ session: [] }],
		parameters: parameters(path, operation),
		...(schema && { requestBody: { required: true, content: { 'application/json': { schema } } } }),
		responses: {
			[status]: { description: status === 204 ? 'Done.' : 'What was asked for.' },
			...refusals(operation)
		}
	};
}

function parameters(path: string, { query }: Operation) {
	const inPath = [...path.matchAll(/\{(\w+)\}/g)].map(([, name]) => ({
		name,
		in: 'path',
		required: true,
		schema: { type: 'string' }
	}));
	const { properties = {} } = query ? z.toJSONSchema(query, { io: 'input', unrepresentable: 'any' }) : {};
	const inQuery = Object.entries(properties).map(([name, schema]) => ({ name, in: 'query', schema }));
	return [...inPath, ...inQuery];
}

function refusals({ access, body }: Operation) {
	const statuses = [
		...(access === 'open' ? [] : [401, 403, 404]),
		...(body ? [400, 409, 413, 415, 422] : []),
		429
	];
	const schema = { $ref: '#/components/schemas/Refusal' };
	return Object.fromEntries(
		statuses.map((status) => [
			status,
			{ description: WHY[status], content: { 'application/json': { schema } } }
		])
	);
}

/** `POST /api/rooms/{room}/supplies` → `PostSupplies`. */
function bodyName(name: string): string {
	const words =
		name
			.replace('/api/', ' ')
			.replace('rooms/{room}/', '')
			.match(/[a-z]+/gi) ?? [];
	return words.map((word) => word.charAt(0).toUpperCase() + word.slice(1).toLowerCase()).join('');
}

/** JSON Schema's own `$id` and `$schema` have no place inside an OpenAPI document. */
function plain(schemas: Record<string, object>) {
	return Object.fromEntries(
		Object.entries(schemas).map(([name, schema]) => {
			const { $id: _id, $schema: _schema, ...rest } = schema as Record<string, unknown>;
			return [name, rest];
		})
	);
}

const READERS = { viewer: 'everybody in the room', member: 'members and owners', owner: 'owners' };
const WHY: Record<number, string> = {
	400: 'Not JSON.',
	401: 'Nobody is signed in.',
	403: 'The role doesn’t allow it.',
	404: 'There is nothing there, or it is somebody else’s.',
	409: 'Somebody else got there first, or there isn’t that much.',
	413: 'Too large.',
	415: 'Not application/json.',
	422: 'Something in it can’t be read; `issues` says what and where.',
	429: 'Too much at once; see Retry-After.'
};
const REFUSAL = {
	type: 'object',
	required: ['message'],
	properties: {
		message: { type: 'string' },
		issues: {
			type: 'array',
			items: {
				type: 'object',
				required: ['path', 'message'],
				properties: { path: { type: 'string' }, message: { type: 'string' } }
			}
		},
		current: { description: 'What stands now, where an edit lost.' }
	}
};
