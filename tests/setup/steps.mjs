import { spawn } from 'node:child_process';
import { root } from './ready.mjs';

const PATIENCE_MS = 20 * 60_000;

/**
 * Starts steps in their order, `atOnce` at a time, each once those in its `after` are done. A step whose
 * forerunner failed isn't run and fails too. Resolves to what every step came to, in the steps' order.
 */
export async function runSteps(steps, atOnce) {
	const waiting = [...steps];
	const underWay = new Map();
	const done = new Map();
	while (waiting.length > 0 || underWay.size > 0) {
		const ready = waiting.filter(({ after = [] }) => after.every((name) => done.has(name)));
		for (const step of ready.slice(0, atOnce - underWay.size)) {
			waiting.splice(waiting.indexOf(step), 1);
			const broken = (step.after ?? []).filter((name) => done.get(name).failed > 0);
			underWay.set(step.name, broken.length > 0 ? leaveOut(step, broken) : runStep(step));
		}
		const result = await Promise.race(underWay.values());
		underWay.delete(result.name);
		done.set(result.name, result);
	}
	return steps.map(({ name }) => done.get(name));
}

async function leaveOut({ name }, broken) {
	console.log(`\n── ${name}: not run, because this failed: ${broken.join(', ')}`);
	return { name, passed: 0, failed: 1, seconds: 0 };
}

/** Commands run one after another until one fails; `count` reads the step's report, else it counts as one. */
async function runStep({ name, commands, count, env = {} }) {
	const started = Date.now();
	let output = '';
	let code = 0;
	for (const command of commands) {
		const ran = typeof command === 'function' ? await attempt(command) : await capture(command, env);
		output += ran.output;
		code = ran.code;
		if (code !== 0) break;
	}
	const counted = count ? count(code) : { passed: Number(code === 0), failed: Number(code !== 0) };
	const seconds = Math.round((Date.now() - started) / 1000);
	const said = output.trimEnd();
	console.log(`\n── ${name} (${seconds} s)`);
	console.log(counted.failed > 0 ? said : said.split('\n').slice(-5).join('\n'));
	return { name, ...counted, seconds };
}

async function attempt(work) {
	try {
		return { code: 0, output: await work() };
	} catch (error) {
		return { code: 1, output: error instanceof Error ? error.message : String(error) };
	}
}

function capture([command, ...args], env) {
	return new Promise((done) => {
		let output = '';
		const take = (chunk) => (output += chunk);
		const child = spawn(command, args, {
			cwd: root,
			env: { ...process.env, CI: 'true', NO_COLOR: '1', ...env },
			stdio: ['ignore', 'pipe', 'pipe']
		});
		const late = setTimeout(() => {
			take(`\nStopped after ${PATIENCE_MS / 60_000} minutes.\n`);
			child.kill('SIGKILL');
		}, PATIENCE_MS);
		child.stdout.on('data', take);
		child.stderr.on('data', take);
		child.on('error', (error) => take(`${error.message}\n`));
		child.on('close', (code) => {
			clearTimeout(late);
			done({ code: code ?? 1, output });
		});
	});
}
