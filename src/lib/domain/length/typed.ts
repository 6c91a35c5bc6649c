/**
 * One spelling for everything that people type or paste: vulgar fractions, superscript fractions, the fraction
 * slash, primes, dashes, multiplication signs and the kinds of space. Lower case, single spaces.
 */
export function plainTyping(text: string): string {
	return text
		.replace(SCRIPT_FRACTION, (_, n: string, d: string) => ` ${n.normalize('NFKC')}/${d.normalize('NFKC')}`)
		.replace(VULGAR_FRACTION, (character) => ` ${character.normalize('NFKD')}`)
		.replace(/[\u2044\u2215\uff0f]/g, '/')
		.replace(/[\u2010-\u2015\u2212\uff0d]/g, '-')
		.replace(/[\u2032\u2018\u2019\u00b4\uff07]/g, "'")
		.replace(/[\u2033\u201c\u201d\u201f\uff02]|''/g, '"')
		.replace(/[\u00d7\u2715\u2716\u2a2f*]/g, 'x')
		.replace(/[\uff10-\uff19]/g, (digit) => digit.normalize('NFKC'))
		.replace(/[\u200b-\u200f\u2060\ufeff]/g, '')
		.replace(/[\s\u2064]+/g, ' ')
		.trim()
		.toLowerCase();
}

/** ¼ ½ ¾ and ⅐ to ⅟; zero thirds (U+2189) is no length. */
const VULGAR_FRACTION = /[\u00bc-\u00be\u2150-\u215f]/g;
const SCRIPT_FRACTION = /([\u2070\u00b9\u00b2\u00b3\u2074-\u2079]+)[/\u2044\u2215]([\u2080-\u2089]+)/g;
