import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { HOME, returnPath } from './return-path';

describe('a return path', () => {
	it.each([
		'//e.test',
		'/\\e.test',
		'https:e.test',
		'https://e.test',
		'javascript:alert(1)',
		'/\t/e.test',
		'/.//e.test',
		'e.test',
		'',
		null,
		undefined
	])('that would leave is not followed: %s', (asked) => {
		expect(returnPath(asked)).toBe(HOME);
	});

	it.each([
		['/supplies?kind=tape&q=a%2Fb', '/supplies?kind=tape&q=a%2Fb'],
		['/projects/1#top', '/projects/1'],
		['/%2F/e.test', '/%2F/e.test'],
		['/a/../room', '/room']
	])('of our own is kept: %s', (asked, kept) => {
		expect(returnPath(asked)).toBe(kept);
	});

	it('stays on this site whatever was asked, as a browser would read it', () => {
		const pieces = fc.constantFrom(
			'/',
			'\\',
			'.',
			'..',
			'\t',
			'\n',
			'@',
			':',
			'e.test',
			'https:',
			'%2f',
			'%5c',
			'?',
			'#',
			' '
		);
		fc.assert(
			fc.property(fc.array(pieces, { maxLength: 8 }), (parts) => {
				const url = new URL(returnPath(parts.join('')), 'https://ours.test/sign-in');
				expect(url.origin).toBe('https://ours.test');
			})
		);
	});
});
