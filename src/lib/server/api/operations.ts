import { z } from 'zod';
import { dateField } from '../../domain/exchange/fields';
import { matchRequestSchema } from '../../domain/exchange';
import { useSheetsSchema } from '../../schemas/cutting';
import { importSchema } from '../../schemas/exchange';
import {
	addProjectSchema,
	chooseDesignSchema,
	editBillSchema,
	renameProjectSchema,
	reorderProjectsSchema,
	setCopiesSchema
} from '../../schemas/projects';
import type { RoomRole } from '../../schemas/rooms';
import {
	addPadSchema,
	addSupplySchema,
	editSupplySchema,
	idField,
	movementSchema,
	moveSchema,
	recountSchema,
	trashSchema,
	undoSchema
} from '../../schemas/supplies';
import { supplyFilterSchema } from '../../schemas/supply-filter';

export interface Operation {
	readonly summary: string;
	/** Who may ask: anybody, or somebody with at least this role in the room that the path names. */
	readonly access: 'open' | RoomRole;
	readonly body?: z.ZodType;
	readonly query?: z.ZodObject;
	/** Most bytes of a body; 256 KB where it isn't said. */
	readonly limit?: number;
	/** Status of an answer that went well; 200 where it isn't said. */
	readonly status?: 201 | 204;
	/** The handler passes the body on to the matcher's thread, which reads it there. */
	readonly readElsewhere?: true;
}

const MEGABYTE = 1024 * 1024;
const asking = z.object({
	mode: z.enum(['each', 'queue']).default('each').catch('each'),
	on: dateField.optional().catch(undefined)
});

/** Every route of the API: what it takes, who may ask, and so what `/api/openapi.json` says. */
export const operations = {
	'POST /api/match': {
		summary: 'Match projects with supplies that the request carries. Stateless; nothing is stored.',
		access: 'open',
		body: matchRequestSchema,
		limit: 2 * MEGABYTE,
		readElsewhere: true
	},
	'GET /api/openapi.json': { summary: 'This description.', access: 'open' },
	'GET /healthz': { summary: 'The process answers.', access: 'open' },
	'GET /readyz': { summary: 'The database and the data folder answer.', access: 'open' },
	'POST /api/rooms/{room}/match': {
		summary: 'Match the room’s projects with its stash; answers as /api/match does.',
		access: 'viewer',
		body: z.strictObject({ mode: z.enum(['each', 'queue']).default('each'), on: dateField.optional() })
	},
	'GET /api/rooms/{room}/today': {
		summary: 'Every project of the room, in the queue’s order, with what the matcher says of it.',
		access: 'viewer',
		query: asking
	},
	'GET /api/rooms/{room}/unlocks': {
		summary: 'What can be bought, and the projects that each purchase alone would turn to now; most first.',
		access: 'viewer',
		query: asking.pick({ on: true })
	},
	'GET /api/rooms/{room}/supplies': {
		summary: 'A page of the stash, filtered.',
		access: 'viewer',
		query: supplyFilterSchema
	},
	'POST /api/rooms/{room}/supplies': {
		summary: 'Add a supply.',
		access: 'member',
		body: addSupplySchema,
		status: 201
	},
	'GET /api/rooms/{room}/supplies/{id}': { summary: 'A supply with its ledger.', access: 'viewer' },
	'PATCH /api/rooms/{room}/supplies/{id}': {
		summary: 'Make a supply what the body says; 409 with both versions where it was edited meanwhile.',
		access: 'member',
		body: editSupplySchema
	},
	'DELETE /api/rooms/{room}/supplies/{id}': {
		summary: 'Put a supply in the trash; `act` names the deed, for undo.',
		access: 'member',
		query: z.object({ act: idField.optional().catch(undefined) }),
		status: 204
	},
	'POST /api/rooms/{room}/supplies/{id}/movements': {
		summary: 'Book what was bought, used, spoiled, passed on, counted, lent or returned.',
		access: 'member',
		body: movementSchema,
		status: 201
	},
	'GET /api/rooms/{room}/bins': {
		summary: 'The room’s bins, with how many supplies each holds.',
		access: 'viewer'
	},
	'POST /api/rooms/{room}/pads': {
		summary: 'Enter a pad: each of its designs becomes a supply.',
		access: 'member',
		body: addPadSchema,
		status: 201
	},
	'POST /api/rooms/{room}/recounts': {
		summary: 'Say what was counted, for one supply or many.',
		access: 'member',
		body: recountSchema
	},
	'POST /api/rooms/{room}/moves': { summary: 'Put supplies in a bin.', access: 'member', body: moveSchema },
	'GET /api/rooms/{room}/trash': { summary: 'What was thrown away in the last 30 days.', access: 'viewer' },
	'POST /api/rooms/{room}/trash': {
		summary: 'Put supplies in the trash.',
		access: 'member',
		body: trashSchema
	},
	'POST /api/rooms/{room}/restores': {
		summary: 'Take supplies back out of the trash.',
		access: 'member',
		body: trashSchema
	},
	'POST /api/rooms/{room}/undo': {
		summary: 'Reverse a deed as a whole; 409 where the stash has moved on.',
		access: 'member',
		body: undoSchema
	},
	'POST /api/rooms/{room}/cuts': {
		summary: 'Cut a plan as it was shown: takes its sheets and files its offcuts, once.',
		access: 'member',
		body: useSheetsSchema,
		limit: 4 * MEGABYTE,
		status: 201
	},
	'GET /api/rooms/{room}/projects': {
		summary: 'The room’s projects in the queue’s order.',
		access: 'viewer'
	},
	'POST /api/rooms/{room}/projects': {
		summary: 'Add a project, last in the queue.',
		access: 'member',
		body: addProjectSchema,
		status: 201
	},
	'PUT /api/rooms/{room}/projects/order': {
		summary: 'Put the queue in order.',
		access: 'member',
		body: reorderProjectsSchema
	},
	'GET /api/rooms/{room}/projects/{id}': {
		summary: 'A project with the times it was cut.',
		access: 'viewer'
	},
	'PATCH /api/rooms/{room}/projects/{id}': {
		summary:
			'Make a project’s bill what the body says; 409 with both versions where it was edited meanwhile.',
		access: 'member',
		body: editBillSchema
	},
	'PUT /api/rooms/{room}/projects/{id}/name': {
		summary: 'Rename a project.',
		access: 'member',
		body: renameProjectSchema
	},
	'PUT /api/rooms/{room}/projects/{id}/copies': {
		summary: 'Say how many are to be made.',
		access: 'member',
		body: setCopiesSchema
	},
	'PUT /api/rooms/{room}/projects/{id}/design': {
		summary: 'Choose the paper that a slot is cut from.',
		access: 'member',
		body: chooseDesignSchema
	},
	'DELETE /api/rooms/{room}/projects/{id}': {
		summary: 'Put a project in the trash.',
		access: 'member',
		status: 204
	},
	'GET /api/rooms/{room}/export': { summary: 'The whole room as an exchange document.', access: 'viewer' },
	'POST /api/rooms/{room}/import': {
		summary: 'Take in an exchange document, all of it or nothing; a dry run only says what it would do.',
		access: 'member',
		body: importSchema,
		limit: 16 * MEGABYTE
	}
} as const satisfies Record<string, Operation>;

export type Operations = typeof operations;
