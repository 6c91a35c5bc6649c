import { randomInt } from 'node:crypto';
import { readdirSync, readFileSync } from 'node:fs';
import { request, type IncomingHttpHeaders } from 'node:http';
import { join } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { inject } from 'vitest';
import type { StoredLetter } from '../fakes/mail-server';

export interface Answer {
	readonly status: number;
	readonly headers: IncomingHttpHeaders;
	readonly text: string;
}

export interface Asking {
	readonly method?: string;
	readonly headers?: Record<string, string>;
	readonly body?: string;
	/** Instead of the browser's own; a loopback address stands for a network. */
	readonly from?: string;
}

/** A client with a cookie jar and a network address of its own; it follows no redirects. */
export class Browser {
	readonly cookies = new Map<string, string>();
	readonly origin = inject('server').origin;

	constructor(readonly from = anotherNetwork()) {}

	ask(path: string, { method = 'GET', headers = {}, body, from = this.from }: Asking = {}): Promise<Answer> {
		const length = body === undefined ? {} : { 'content-length': String(Buffer.byteLength(body)) };
		const cookie = [...this.cookies].map(([name, value]) => `${name}=${value}`).join('; ');
		return new Promise((resolve, reject) => {
			const sent = request(
				new URL(path, this.origin),
				{
					method,
					localAddress: from,
					headers: { accept: 'text/html', ...(cookie && { cookie }), ...length, ...headers },
					agent: false
				},
				(response) => {
					let text = '';
					response.setEncoding('utf8');
					response.on('data', (chunk: string) => (text += chunk));
					response.on('end', () => {
						this.#keep(response.headers['set-cookie'] ?? []);
						resolve({ status: response.statusCode ?? 0, headers: response.headers, text });
					});
				}
			);
			sent.on('error', reject);
			sent.end(body);
		});
	}

	/** Posts a form as one of the site's own pages would. */
	post(path: string, fields: Record<string, string> = {}, asking: Asking = {}): Promise<Answer> {
		return this.ask(path, {
			method: 'POST',
			...asking,
			headers: {
				origin: this.origin,
				'content-type': 'application/x-www-form-urlencoded',
				...asking.headers
			},
			body: new URLSearchParams(fields).toString()
		});
	}

	/** Sends JSON as one of the site's own pages would. */
	send(method: string, path: string, value: unknown): Promise<Answer> {
		return this.ask(path, {
			method,
			headers: { origin: this.origin, 'content-type': 'application/json' },
			body: JSON.stringify(value)
		});
	}

	get session(): string | undefined {
		return this.cookies.get('__Host-paperlarder');
	}

	#keep(setCookies: readonly string[]): void {
		for (const line of setCookies) {
			const [, name = '', value = ''] = /^([^=]+)=([^;]*)/.exec(line) ?? [];
			if (value === '') this.cookies.delete(name);
			else this.cookies.set(name, value);
		}
	}
}

/** A loopback address that nothing else in this run asks from. */
export function anotherNetwork(): string {
	const byte = () => randomInt(1, 255);
	return `127.${byte()}.${byte()}.${byte()}`;
}

/** The letters that have been sent to an address so far, the oldest first. */
export function lettersTo(address: string): StoredLetter[] {
	const folder = join(inject('server').folder, 'mail');
	return readdirSync(folder)
		.filter((name) => /^\d.*\.json$/.test(name))
		.sort()
		.map((name) => JSON.parse(readFileSync(join(folder, name), 'utf8')) as StoredLetter)
		.filter(({ to }) => to === address);
}

/** Waits until there is a letter to the address with that subject, and gives the path of the link in it. */
export async function linkIn(address: string, subject: RegExp, nth = 0): Promise<string> {
	for (let tries = 0; tries < 200; tries++) {
		const letter = lettersTo(address).filter((one) => subject.test(one.subject))[nth];
		const link = letter && /https?:\/\/\S+/.exec(letter.text)?.[0];
		if (link) return link.replace(inject('server').origin, '');
		await pause(50);
	}
	throw new Error(`No letter to ${address} about ${String(subject)}`);
}
