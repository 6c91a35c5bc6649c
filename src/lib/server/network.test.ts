import { describe, expect, it } from 'vitest';
import { networkOf } from './network';

const network = (address: string) => networkOf({ getClientAddress: () => address });

describe('the network that is counted', () => {
	it('is an IPv4 address as it is, in whatever form the socket gives it', () => {
		expect(network('192.0.2.7')).toBe('192.0.2.7');
		expect(network('::ffff:192.0.2.7')).toBe('192.0.2.7');
	});

	it('is the /64 of an IPv6 address', () => {
		expect(network('2001:db8:1:2:3:4:5:6')).toBe('2001:db8:1:2::/64');
		expect(network('2001:db8:1:2::9')).toBe('2001:db8:1:2::/64');
		expect(network('2001:db8::1')).toBe('2001:db8:0:0::/64');
		expect(network('::1')).toBe('0:0:0:0::/64');
		expect(network('fe80::1%eth0')).toBe('fe80:0:0:0::/64');
	});

	it('is one for all whose proxy says nothing', () => {
		const silent = () => {
			throw new Error('header is absent');
		};
		expect(networkOf({ getClientAddress: silent })).toBe('unknown');
	});
});
