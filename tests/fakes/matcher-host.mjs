/** Stands in for the built matcher: answers as the question's request tells it to. */
import { parentPort } from 'node:worker_threads';

parentPort.on('message', ({ id, question }) => {
	const { say, wait = 0, loop = false, fall = false } = question.request;
	if (fall) throw new Error('fell over');
	while (loop);
	setTimeout(
		() => parentPort.postMessage({ id, reply: { ok: true, response: { say, thread: process.pid } } }),
		wait
	);
});
