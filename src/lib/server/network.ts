import type { RequestEvent } from '@sveltejs/kit';
import { isIPv6 } from 'node:net';

/**
 * The address a request came from, as the throttles count it: an IPv6 subscriber holds a whole /64. Comes from
 * the connection, or from the one header that the server was told its own proxy sets (ADDRESS_HEADER).
 */
export function networkOf(event: Pick<RequestEvent, 'getClientAddress'>): string {
	const address = clientAddress(event).replace(/^::ffff:(?=\d+\.)/i, '');
	return isIPv6(address) ? `${expandIPv6(address).slice(0, 4).join(':')}::/64` : address;
}

function clientAddress(event: Pick<RequestEvent, 'getClientAddress'>): string {
	try {
		return event.getClientAddress();
	} catch {
		return 'unknown';
	}
}

function expandIPv6(address: string): string[] {
	const [head = '', tail] = address.split('%', 1).join('').split('::');
	const left = head.split(':').filter(Boolean);
	const right = tail?.split(':').filter(Boolean) ?? [];
	return [...left, ...Array<string>(Math.max(0, 8 - left.length - right.length)).fill('0'), ...right];
}
