/** The matcher in the browser. Each message `{ id, question }` is answered by `{ id, reply }`. */
import { answerMatch, stopByClock, type MatchQuestion } from './match';

self.addEventListener('message', ({ data }: MessageEvent<{ id: number; question: MatchQuestion }>) => {
	self.postMessage({ id: data.id, reply: answerMatch(data.question, stopByClock) });
});
