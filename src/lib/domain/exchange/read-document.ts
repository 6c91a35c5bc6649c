import type { Bill } from '../bill/bill';
import type { MatchOptions } from '../matching/verdict';
import type { Supply } from '../stash';
import { billFrom } from './read-bill';
import { documentSchema, matchRequestSchema, type MovementDocument } from './document-schema';
import { movementFrom, type Movement } from './read-movement';
import { Reading, type BareUnit } from './reading';
import { supplyFrom } from './read-supply';
import { shaped } from './shape';
import { Unreadable } from './unreadable';

export interface Exchange {
	readonly supplies: readonly Supply[];
	readonly bills: readonly Bill[];
	readonly bins: readonly { readonly key: string; readonly name: string }[];
	readonly ledger: readonly Movement[];
	/** Projects in the order in which they are to be made. */
	readonly order: readonly { readonly project: string; readonly copies: number }[];
}

/**
 * Reads a whole exchange document, from its text or from parsed JSON.
 * @param units what a bare number means
 * @throws Unreadable with every issue found
 */
export function readDocument(given: unknown, units: BareUnit): Exchange {
	const document = shaped(documentSchema, typeof given === 'string' ? parsed(given) : given);
	const reading = new Reading(units);
	const supplies = (document.supplies ?? []).map((supply, index) =>
		supplyFrom(supply, reading.at('supplies', index))
	);
	const bills = (document.projects ?? []).map((bill, index) => billFrom(bill, reading.at('projects', index)));
	const exchange = {
		supplies,
		bills,
		bins: document.bins ?? [],
		ledger: ledgerFrom(document.ledger ?? [], supplies, reading),
		order: (document.order ?? []).map(({ project, copies }) => ({ project, copies: copies ?? 1 }))
	};
	checkOrder(exchange, reading);
	reading.finish();
	return exchange;
}

export interface MatchRequest {
	readonly bills: readonly Bill[];
	readonly supplies: readonly Supply[];
	readonly mode: 'each' | 'queue';
	readonly copies: Readonly<Record<string, number>>;
	/** YYYY-MM-DD */
	readonly on: string;
	readonly budgetMs: number;
	readonly options: MatchOptions;
}

/**
 * Reads what `POST /api/match` is asked.
 * @param today YYYY-MM-DD, for a request that names no date
 * @throws Unreadable with every issue found
 */
export function readMatchRequest(json: unknown, today: string): MatchRequest {
	const request = shaped(matchRequestSchema, json);
	const { units, kerf, reach, knife, keepOffcut } = request.options;
	const reading = new Reading(units);
	const projects = new Set(request.projects.map(({ key }) => key));
	for (const key of Object.keys(request.copies)) {
		if (!projects.has(key)) reading.fail(`copies.${key}`, 'None of the projects has this key.');
	}
	const options = reading.at('options');
	const read = {
		bills: request.projects.map((bill, index) => billFrom(bill, reading.at('projects', index))),
		supplies: request.supplies.map((supply, index) => supplyFrom(supply, reading.at('supplies', index))),
		mode: request.mode,
		copies: request.copies,
		on: request.on ?? today,
		budgetMs: request.budgetMs,
		options: {
			units,
			kerf: options.length('kerf', kerf, { zero: true }),
			reach: reach === null ? null : options.length('reach', reach),
			knife,
			keepOffcut: keepOffcut === null ? null : options.length('keepOffcut', keepOffcut)
		}
	};
	reading.finish();
	return read;
}

function parsed(text: string): unknown {
	try {
		return JSON.parse(text);
	} catch {
		throw new Unreadable([
			{ path: '', message: 'This isn’t JSON. An exchange document is exported as a .json file.' }
		]);
	}
}

function ledgerFrom(
	ledger: readonly MovementDocument[],
	supplies: readonly Supply[],
	reading: Reading
): Movement[] {
	const byKey = new Map(supplies.map((supply) => [supply.key, supply]));
	const keys = new Set(ledger.map(({ key }) => key));
	return ledger.map((line, index) => {
		const here = reading.at('ledger', index);
		if (line.undoes !== undefined && !keys.has(line.undoes))
			here.fail('undoes', `The ledger has no line with the key “${line.undoes}”.`);
		return movementFrom(line, byKey.get(line.supply), here);
	});
}

function checkOrder({ order, bills }: Exchange, reading: Reading): void {
	const keys = new Set(bills.map(({ key }) => key));
	const seen = new Set<string>();
	order.forEach(({ project }, index) => {
		if (!keys.has(project))
			reading.at('order', index).fail('project', `This document has no project with the key “${project}”.`);
		if (seen.has(project)) reading.at('order', index).fail('project', 'This project is in the order twice.');
		seen.add(project);
	});
}
