import type { Config } from 'tailwindcss';

/** Names for the design tokens of `src/app.css`; both themes live there. */
export default {
	content: ['./src/**/*.{html,svelte,ts}'],
	theme: {
		extend: {
			colors: {
				paper: 'var(--paper)',
				sheet: 'var(--sheet)',
				wash: 'var(--wash)',
				ink: 'var(--ink)',
				soft: 'var(--ink-soft)',
				line: 'var(--line)',
				edge: 'var(--edge)',
				kraft: 'var(--kraft)',
				'kraft-wash': 'var(--kraft-wash)',
				teal: 'var(--teal)',
				'teal-wash': 'var(--teal-wash)',
				marigold: 'var(--marigold)',
				'marigold-wash': 'var(--marigold-wash)',
				red: 'var(--red)',
				'red-wash': 'var(--red-wash)',
				mat: 'var(--mat)',
				'on-mat': 'var(--on-mat)'
			},
			fontFamily: { sans: ['Quicksand', 'ui-rounded', 'system-ui', 'sans-serif'] },
			maxWidth: { page: '76rem', prose: '62ch' }
		}
	}
} satisfies Config;
