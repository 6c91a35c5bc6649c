import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { root, runNode } from '../tests/setup/ready.mjs';

const BUILT_FROM = [
	'package-lock.json',
	'svelte.config.js',
	'vite.config.ts',
	'tailwind.config.ts',
	'src',
	'static'
];

/** Builds unless what was built last came from exactly these sources. Ends the process where that fails. */
export async function build() {
	const stamp = join(root, 'build/built-from');
	const sources = hashOf(BUILT_FROM);
	if (existsSync(stamp) && readFileSync(stamp, 'utf8') === sources) return;
	console.log('Building…');
	for (const args of [['build'], ['build', '--mode', 'workers']]) {
		const code = await runNode('vite/bin/vite.js', [...args, '--logLevel', 'error']);
		if (code !== 0) process.exit(code);
	}
	writeFileSync(stamp, sources);
}

function hashOf(paths) {
	const hash = createHash('sha256');
	const add = (path) => {
		const full = join(root, path);
		if (!existsSync(full)) return;
		if (statSync(full).isDirectory()) {
			for (const name of readdirSync(full).sort()) add(join(path, name));
		} else {
			hash.update(path).update(readFileSync(full));
		}
	};
	paths.forEach(add);
	return hash.digest('hex');
}
