import { subscribe } from 'node:diagnostics_channel';
import type { OutgoingHttpHeader, OutgoingHttpHeaders, ServerResponse } from 'node:http';

/** For whatever sets none of its own: pages have a stricter policy, with nonces, from Kit. */
const HEADERS: Record<string, string> = {
	'strict-transport-security': 'max-age=63072000; includeSubDomains',
	'x-content-type-options': 'nosniff',
	'referrer-policy': 'same-origin',
	'permissions-policy': 'camera=(self), geolocation=(), microphone=(), payment=(), usb=()',
	'cross-origin-opener-policy': 'same-origin',
	'cross-origin-resource-policy': 'same-origin',
	'content-security-policy':
		"default-src 'self'; object-src 'none'; base-uri 'none'; form-action 'self'; frame-ancestors 'none'"
};

/**
 * Sets the security headers on every response of this process. adapter-node answers for static files and
 * unreadable requests before any hook runs, so this is done where Node hands a request over.
 */
export function setHeadersOnEverything(): void {
	subscribe('http.server.request.start', (message) => {
		const { response } = message as { response: ServerResponse };
		for (const [name, value] of Object.entries(HEADERS)) response.setHeader(name, value);
		nameCharset(response);
	});
}

/** Text that doesn't say its encoding can be made to mean something else; static files and pages leave it out. */
function nameCharset(response: ServerResponse): void {
	const writeHead = response.writeHead.bind(response) as (
		status: number,
		headers?: OutgoingHttpHeaders | OutgoingHttpHeader[]
	) => ServerResponse;
	response.writeHead = ((status: number, headers: OutgoingHttpHeaders = {}) => {
		for (const [name, value] of Object.entries(headers)) response.setHeader(name, value as string);
		// Given only here: adapter-node keeps a type that is set already, so a script would be served as text.
		const type = String(response.getHeader('content-type') ?? 'text/plain');
		if (/^text\/|[+/]xml\b/.test(type) && !type.includes('charset')) {
			response.setHeader('content-type', `${type}; charset=utf-8`);
		}
		return writeHead(status);
	}) as typeof response.writeHead;
}
