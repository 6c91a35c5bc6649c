import { subscribe } from 'node:diagnostics_channel';
import type { ServerResponse } from 'node:http';

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
	});
}
