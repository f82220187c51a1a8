import { evaluateContent, retwistContent, solveLive } from '@tipward/design-model';
import type { SolverCall, SolverCalls, SolverContext, SolverReply, SolverRequest } from './protocol.ts';

/** Marks an evaluation of a draft: it was never saved, so it has no hash to be found by. */
const UNSAVED = 'unsaved';

type Handlers = {
  [C in SolverCall]: (input: SolverCalls[C]['input']) => SolverCalls[C]['output'];
};

function handlersFor(contexts: Map<string, SolverContext>): Handlers {
  const contextOf = (key: string): SolverContext => {
    const context = contexts.get(key);
    if (context === undefined) throw new Error(`The solver knows no context '${key}'`);
    return context;
  };
  return {
    setContext: ({ key, context }) => {
      contexts.set(key, context);
      return null;
    },
    warmUp: ({ key, content }) => {
      const { specification, airfoils } = contextOf(key);
      const start = performance.now();
      solveLive({ content, specification, airfoils, tipSpeedRatio: null });
      return performance.now() - start;
    },
    solveLive: ({ key, content, tipSpeedRatio }) => {
      const { specification, airfoils } = contextOf(key);
      return solveLive({ content, specification, airfoils, tipSpeedRatio });
    },
    evaluate: ({ key, content }) => evaluateContent({ ...contextOf(key), content, contentHash: UNSAVED }),
    retwist: ({ key, content }) => {
      const { specification, airfoils } = contextOf(key);
      return retwistContent({ content, specification, airfoils });
    },
  };
}

function outputOf<C extends SolverCall>(
  handlers: Handlers,
  call: C,
  input: SolverCalls[C]['input'],
): SolverCalls[C]['output'] {
  return handlers[call](input);
}

/** The worker's mind without the worker: keeps contexts, answers requests; a refusal becomes a reply, never a crash. */
export function createAnswerer(): (request: SolverRequest) => SolverReply {
  const handlers = handlersFor(new Map());
  return (request) => {
    try {
      return {
        serial: request.serial,
        ok: true,
        output: outputOf(handlers, request.call, request.input),
      };
    } catch (error) {
      return {
        serial: request.serial,
        ok: false,
        message: error instanceof Error ? error.message : String(error),
      };
    }
  };
}
