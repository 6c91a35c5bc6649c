import { execFileSync } from 'node:child_process';

export interface BuiltRoute {
	/** As Kit names it: `/(app)/projects/[id]`. */
	readonly id: string;
	readonly page: boolean;
	/** Methods that its endpoint answers. */
	readonly methods: readonly string[];
	/** Names of its page's actions; `default` is the page's own. */
	readonly actions: readonly string[];
}

/** Every route that the build answers. */
export function builtRoutes(): BuiltRoute[] {
	const listed = execFileSync(process.execPath, ['tests/setup/list-routes.mjs'], { encoding: 'utf8' });
	return JSON.parse(listed) as BuiltRoute[];
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
