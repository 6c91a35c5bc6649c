import { existsSync } from 'node:fs';
import { availableParallelism } from 'node:os';
import { resolve } from 'node:path';
import { Worker } from 'node:worker_threads';
import type { MatchQuestion, MatchReply } from '../workers/match';
import { TooMany } from './errors';

export interface Matcher {
	/**
	 * Answers a question off the event loop.
	 * @param budgetMs what the question allows itself; a thread that takes far longer is ended
	 * @throws {TooMany} where too many are waiting, or the thread had to be ended
	 */
	readonly ask: (question: MatchQuestion, budgetMs: number, rank?: Rank) => Promise<MatchReply>;
	readonly close: () => Promise<void>;
}

/** A room's own questions go before visitors'. */
type Rank = 'room' | 'visitor';

interface Job {
	readonly rank: Rank;
	readonly question: MatchQuestion;
	readonly budgetMs: number;
	readonly settle: (reply: MatchReply) => void;
	readonly fail: (error: Error) => void;
}

interface Thread {
	readonly worker: Worker;
	job: Job | null;
	timer: NodeJS.Timeout | undefined;
}

const MOST_WAITING = { room: 200, visitor: 20 };
const IDLE_MS = 60_000;

/** The running server's matcher: threads from the built file, this thread where there is none. */
export const matcher = openMatcher(import.meta.env?.DEV ? null : resolve('build/workers/match.js'));

/**
 * @param file the built host of the matcher; null, or a file that isn't there, answers on this thread
 * @param most threads at once
 * @param graceMs what reading the question and writing the answer may take on top of a question's own budget
 */
export function openMatcher(
	file: string | null,
	most = Math.min(2, availableParallelism()),
	graceMs = 10_000
): Matcher {
	if (file === null || !existsSync(file)) return { ask: answerHere, close: async () => {} };
	const threads = new Set<Thread>();
	const waiting: Record<Rank, Job[]> = { room: [], visitor: [] };
	let message = 0;

	const ask: Matcher['ask'] = (question, budgetMs, rank = 'visitor') =>
		new Promise((settle, fail) => {
			if (waiting[rank].length >= MOST_WAITING[rank]) return fail(new TooMany(5, BUSY));
			waiting[rank].push({ rank, question, budgetMs, settle, fail });
			next();
		});

	function next(): void {
		const free = [...threads].find(({ job }) => job === null);
		if (!free && threads.size >= most) return;
		const forVisitors = most === 1 || visitorsAt() < most - 1;
		const job = waiting.room.shift() ?? (forVisitors ? waiting.visitor.shift() : undefined);
		if (!job) return;
		const thread = free ?? start();
		clearTimeout(thread.timer);
		thread.job = job;
		thread.timer = setTimeout(() => end(thread, new TooMany(5, BUSY)), job.budgetMs + graceMs);
		thread.worker.postMessage({ id: ++message, question: job.question });
	}

	/** Visitors never hold every thread at once. */
	function visitorsAt(): number {
		return [...threads].filter(({ job }) => job?.rank === 'visitor').length;
	}

	function start(): Thread {
		const worker = new Worker(file!, { resourceLimits: { maxOldGenerationSizeMb: 512 } });
		const thread: Thread = { worker, job: null, timer: undefined };
		worker.unref();
		worker.on('message', ({ reply }: { reply: MatchReply }) => {
			thread.job?.settle(reply);
			rest(thread);
			next();
		});
		worker.on('error', (error) => end(thread, error));
		worker.on('exit', () => end(thread, new Error('The matcher’s thread ended.')));
		threads.add(thread);
		return thread;
	}

	function rest(thread: Thread): void {
		clearTimeout(thread.timer);
		thread.job = null;
		thread.timer = setTimeout(() => end(thread, new Error('idle')), IDLE_MS).unref();
	}

	function end(thread: Thread, error: Error): Promise<number> | undefined {
		if (!threads.delete(thread)) return;
		clearTimeout(thread.timer);
		thread.job?.fail(error);
		const ended = thread.worker.terminate();
		next();
		return ended;
	}

	async function close(): Promise<void> {
		const jobs = [...waiting.room.splice(0), ...waiting.visitor.splice(0)];
		for (const job of jobs) job.fail(new TooMany(5, BUSY));
		await Promise.all([...threads].map((thread) => end(thread, new TooMany(5, BUSY))));
	}

	return { ask, close };
}

const BUSY = 'Too many plans are being worked out just now. Try again in a moment.';

async function answerHere(question: MatchQuestion): Promise<MatchReply> {
	const { answerMatch, stopByClock } = await import('../workers/match');
	return answerMatch(question, stopByClock);
}
