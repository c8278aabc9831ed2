import { answerQuestion } from './answerQuestion';
import type { CompileQuestion } from './messages';

/**
 * Compiles off the main thread, so that typing never waits. Questions that arrive while one is being answered
 * replace one another: only the newest is worth an answer.
 */
let waiting: CompileQuestion | null = null;

function answerNewest(): void {
  const question = waiting;
  if (!question) return;
  waiting = null;
  const answer = answerQuestion(question, () => performance.now());
  self.postMessage(answer, answer.built ? { transfer: [answer.built.world.buffer] } : {});
}

self.addEventListener('message', (event: MessageEvent<CompileQuestion>) => {
  if (!waiting) setTimeout(answerNewest, 0);
  waiting = event.data;
});
