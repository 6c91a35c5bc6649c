// `npm run demo`: installs, builds, seeds and serves the demonstration room. Plain Node until it has installed.
import { spawn } from 'node:child_process';
import { randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { createServer } from 'node:net';
import { join } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { bin, checkNode, install, root } from '../tests/setup/ready.mjs';
import { build } from './build.mjs';

const data = join(root, 'data/demo');
const running = join(data, 'running.json');
const cast = JSON.parse(readFileSync(join(root, 'seeds/cast.json'), 'utf8'));
const children = [];
let ending = false;

checkNode();
await refuseTwice();
if (process.argv.includes('--reset')) rmSync(data, { recursive: true, force: true });
await install();
await build();

mkdirSync(data, { recursive: true });
const port = await freePort(Number(process.env.PORT || 3000));
const origin = `http://localhost:${port}`;
const env = {
	...process.env,
	NODE_ENV: 'production',
	HOST: '127.0.0.1',
	PORT: String(port),
	ORIGIN: origin,
	DATA_DIR: data,
	DATABASE_URL: `file:${join(data, 'paperlarder.db')}`,
	AUTH_SECRET: secret(),
	SMTP_URL: 'smtp://127.0.0.1:2525',
	LOG_LEVEL: process.env.LOG_LEVEL || 'warn',
	SHUTDOWN_TIMEOUT: '2',
	DEMO: '1'
};

for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => end(0));
process.on('exit', () => rmSync(running, { force: true }));
await seed();
// Looked for only now: filling the room takes long enough for another program to take the port.
const mailPort = await freePort(2525);
env.SMTP_URL = `smtp://127.0.0.1:${mailPort}`;
start([...bin('tsx/dist/cli.mjs'), 'tests/fakes/smtp.ts'], { SMTP_PORT: String(mailPort) });
start([process.execPath, 'build']);
await ready();
writeFileSync(running, JSON.stringify({ origin }));
sayHow();

/** Two servers on one data folder would each seed and migrate it; the second one points at the first. */
async function refuseTwice() {
	if (!existsSync(running)) return;
	const other = JSON.parse(readFileSync(running, 'utf8')).origin;
	if (!(await answers(`${other}/healthz`))) return;
	console.log(`The demonstration is running already, at ${other}`);
	process.exit(process.argv.includes('--reset') ? 1 : 0);
}

/** A secret of this folder's own, so that sign-ins outlive a restart. */
function secret() {
	const path = join(data, 'secret');
	if (!existsSync(path)) writeFileSync(path, randomBytes(33).toString('base64'), { mode: 0o600 });
	return readFileSync(path, 'utf8');
}

async function seed() {
	const seeded = join(data, 'seeded');
	if (existsSync(seeded)) return;
	console.log('Drawing papers and filling the room…');
	for (const name of readdirSync(data)) if (name.startsWith('paperlarder.db')) rmSync(join(data, name));
	const code = await new Promise((done) => {
		const [command, ...args] = [...bin('tsx/dist/cli.mjs'), 'seeds/seed.ts'];
		spawn(command, args, { cwd: root, env, stdio: 'inherit' }).on('close', done);
	});
	if (code !== 0) end(1);
	writeFileSync(seeded, new Date().toISOString());
}

function start([command, ...args], more = {}) {
	const child = spawn(command, args, { cwd: root, env: { ...env, ...more }, stdio: 'inherit' });
	children.push(child);
	child.on('exit', () => {
		if (!ending) console.error('Something that the demonstration needs has stopped; see above.');
		end(1);
	});
}

/** Ends all that was started, and then itself. */
async function end(code) {
	if (ending) return;
	ending = true;
	const gone = children.map(
		(child) => new Promise((done) => (child.exitCode === null ? child.on('exit', done) : done()))
	);
	for (const child of children) child.kill('SIGTERM');
	await Promise.race([Promise.all(gone), pause(5_000)]);
	for (const child of children) child.kill('SIGKILL');
	process.exit(code);
}

async function ready() {
	for (let tries = 0; tries < 150; tries++) {
		if (await answers(`${origin}/readyz`)) return;
		await pause(200);
	}
	console.error('The server did not come up within half a minute.');
	await end(1);
}

async function answers(url) {
	try {
		return (await fetch(url, { signal: AbortSignal.timeout(2_000) })).ok;
	} catch {
		return false;
	}
}

/** The port wished for, or the next one that nobody listens on. */
async function freePort(wish) {
	for (let port = wish; port < wish + 100; port++) {
		const free = await new Promise((done) => {
			const probe = createServer()
				.once('error', () => done(false))
				.listen(port, '127.0.0.1', () => probe.close(() => done(true)));
		});
		if (free) return port;
	}
	throw new Error(`No port is free from ${wish} on.`);
}

function sayHow() {
	const wide = Math.max(...cast.people.map(({ email }) => email.length));
	const lines = cast.people.map(
		({ role, email, password }) => `  ${role.padEnd(7)} ${email.padEnd(wide)}  ${password}`
	);
	console.log(`
Paperlarder is at ${origin}

Sign in with an address and its password:
${lines.join('\n')}

Letters that it sends are at ${origin}/demo/mail
Ctrl-C stops it; the data stays in data/demo. Start over with: npm run demo -- --reset
`);
}
