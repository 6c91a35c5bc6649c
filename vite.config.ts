import { sveltekit } from '@sveltejs/kit/vite';
import tailwindcss from '@tailwindcss/vite';
import { defineConfig } from 'vitest/config';

/** The planner's server host is a file of its own: a worker thread cannot start from Kit's bundle. */
const workers = defineConfig({
	publicDir: false,
	build: {
		ssr: true,
		outDir: 'build/workers',
		emptyOutDir: true,
		target: 'node20',
		rollupOptions: { input: { match: 'src/lib/workers/match.node.ts' } }
	},
	ssr: { noExternal: true }
});

const app = defineConfig({
	plugins: [tailwindcss(), sveltekit()],
	test: {
		testTimeout: 30_000,
		projects: [
			{
				extends: true,
				test: {
					name: 'unit',
					include: [
						'src/**/*.test.ts',
						'tests/published/**/*.test.ts',
						'tests/services/**/*.test.ts',
						'tests/api/**/*.test.ts'
					]
				}
			},
			{
				extends: true,
				test: {
					name: 'built',
					include: ['tests/security/**/*.test.ts'],
					globalSetup: 'tests/setup/server.ts',
					hookTimeout: 120_000,
					testTimeout: 120_000
				}
			}
		]
	}
});

export default defineConfig(({ mode }) => (mode === 'workers' ? workers : app));
