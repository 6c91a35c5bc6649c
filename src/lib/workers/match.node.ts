/** The matcher on a thread of the server's. Each message `{ id, question }` is answered by `{ id, reply }`. */
import { parentPort } from 'node:worker_threads';
import { answerMatch, stopByClock, type MatchQuestion } from './match';

parentPort?.on('message', ({ id, question }: { id: number; question: MatchQuestion }) => {
	parentPort?.postMessage({ id, reply: answerMatch(question, stopByClock) });
});
