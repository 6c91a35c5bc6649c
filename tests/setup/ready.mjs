// What `npm test` and `npm run demo` need before anything is installed: plain Node, no packages.
import { spawn } from 'node:child_process';
import { existsSync, readFileSync } from 'node:fs';
import { join, resolve } from 'node:path';

export const root = resolve(import.meta.dirname, '../..');
const LEAST_NODE = [20, 19];

/** Ends with a sentence where this Node is older than the packages need. */
export function checkNode() {
	const [major = 0, minor = 0] = process.versions.node.split('.').map(Number);
	if (major > LEAST_NODE[0] || (major === LEAST_NODE[0] && minor >= LEAST_NODE[1])) return;
	console.error(`Paperlarder needs Node ${LEAST_NODE.join('.')} or newer; this is ${process.versions.node}.`);
	process.exit(1);
}

/** Installs from the lock file unless what it asks for is there already. */
export async function install() {
	if (isInstalled()) return;
	console.log('Installing packages from the lock file…');
	const code = await run('npm', ['ci', '--include=dev', '--no-audit', '--no-fund']);
	if (code !== 0) {
		console.error('The packages could not be installed: see what npm said above.');
		process.exit(1);
	}
}

/** npm keeps a copy of the lock beside what it installed; packages for other machines are not in it. */
function isInstalled() {
	const installed = join(root, 'node_modules/.package-lock.json');
	if (!existsSync(installed)) return false;
	const have = JSON.parse(readFileSync(installed, 'utf8')).packages;
	const want = JSON.parse(readFileSync(join(root, 'package-lock.json'), 'utf8')).packages;
	return Object.entries(want).every(
		([path, { version, optional }]) => path === '' || optional || have[path]?.version === version
	);
}

/** Runs a command in the project's folder with this terminal; resolves to its exit code. */
export function run(command, args, env = {}) {
	return new Promise((done) => {
		const child = spawn(command, args, { cwd: root, stdio: 'inherit', env: { ...process.env, ...env } });
		child.on('error', () => done(127));
		child.on('close', (code) => done(code ?? 1));
	});
}

/** A package's own command, to be run by this Node. */
export const bin = (path) => [process.execPath, join(root, 'node_modules', path)];

export const runNode = (path, args) => run(process.execPath, [join(root, 'node_modules', path), ...args]);
