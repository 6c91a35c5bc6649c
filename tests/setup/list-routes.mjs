// Prints every route that the build answers, read from its own manifest by Node itself.
import { resolve } from 'node:path';
import { pathToFileURL } from 'node:url';

const METHODS = ['GET', 'HEAD', 'POST', 'PUT', 'PATCH', 'DELETE', 'OPTIONS'];

const path = pathToFileURL(resolve('.svelte-kit/output/server/manifest-full.js')).href;
const { manifest } = await import(path);
const routes = await Promise.all(
	manifest._.routes.map(async ({ id, page, endpoint }) => {
		const handlers = endpoint ? await endpoint() : {};
		const node = page ? await manifest._.nodes[page.leaf]() : undefined;
		return {
			id,
			page: page !== null,
			methods: METHODS.filter((method) => method in handlers),
			actions: Object.keys(node?.server?.actions ?? {})
		};
	})
);
process.stdout.write(JSON.stringify(routes), () => process.exit(0));
