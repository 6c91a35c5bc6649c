import { resolve } from 'node:path';
import { pathToFileURL } from 'node:url';

export interface BuiltRoute {
	/** As Kit names it: `/(app)/projects/[id]`. */
	readonly id: string;
	readonly page: boolean;
	/** Methods that its endpoint answers. */
	readonly methods: readonly string[];
	/** Names of its page's actions; `default` is the page's own. */
	readonly actions: readonly string[];
}

interface Manifest {
	readonly _: {
		readonly routes: readonly {
			readonly id: string;
			readonly page: { readonly leaf: number } | null;
			readonly endpoint: (() => Promise<Record<string, unknown>>) | null;
		}[];
		readonly nodes: readonly (() => Promise<{ server?: { actions?: Record<string, unknown> } }>)[];
	};
}

const METHODS = ['GET', 'HEAD', 'POST', 'PUT', 'PATCH', 'DELETE', 'OPTIONS'];

/** Every route that the build answers, from its own manifest. */
export async function builtRoutes(): Promise<BuiltRoute[]> {
	const path = pathToFileURL(resolve('.svelte-kit/output/server/manifest-full.js')).href;
	const { manifest } = (await import(/* @vite-ignore */ path)) as { manifest: Manifest };
	return Promise.all(
		manifest._.routes.map(async ({ id, page, endpoint }) => {
			const handlers = endpoint ? await endpoint() : {};
			const node = page ? await manifest._.nodes[page.leaf]?.() : undefined;
			return {
				id,
				page: page !== null,
				methods: METHODS.filter((method) => method in handlers),
				actions: Object.keys(node?.server?.actions ?? {})
			};
		})
	);
}

/** The path of a route, its parameters filled in. */
export function pathOf(id: string, params: Readonly<Record<string, string>>): string {
	const path = id
		.replaceAll(/\/\([^)]+\)/g, '')
		.replaceAll(/\[([^\]=]+)(?:=[^\]]+)?\]/g, (_, name: string) => {
			const value = params[name];
			if (value === undefined) throw new Error(`No value for [${name}] of ${id}`);
			return value;
		});
	return path || '/';
}
