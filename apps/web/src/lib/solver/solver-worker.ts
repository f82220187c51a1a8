import { createAnswerer } from './answer-request.ts';
import type { SolverRequest } from './protocol.ts';

const answer = createAnswerer();

self.addEventListener('message', (event: MessageEvent<SolverRequest>) => {
  self.postMessage(answer(event.data));
});
