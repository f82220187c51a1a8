import type { SolverCall, SolverCalls, SolverContext, SolverReply, SolverRequest } from './protocol.ts';

/** The part of a Worker a link needs. */
export interface SolverPort {
  postMessage(request: SolverRequest): void;
  addEventListener(type: 'message', listener: (event: { data: SolverReply }) => void): void;
  addEventListener(type: 'error', listener: (event: { message?: string }) => void): void;
  terminate(): void;
}

interface Waiting {
  readonly resolve: (output: never) => void;
  readonly reject: (error: Error) => void;
}

/**
 * Calls into one solver worker. The worker starts with the first call, and starts again after it fell over or was closed;
 * contexts are then sent anew.
 */
export class SolverLink {
  private port: SolverPort | null = null;
  private serial = 0;
  private readonly waiting = new Map<number, Waiting>();
  private readonly contexts = new Map<string, SolverContext>();
  private readonly spawn: () => SolverPort;

  constructor(spawn: () => SolverPort) {
    this.spawn = spawn;
  }

  /** Sends a context unless the worker holds it already. */
  setContext(key: string, context: SolverContext): void {
    if (this.port !== null && this.contexts.get(key) === context) return;
    this.contexts.set(key, context);
    // A refusal here would come back with the next call, which names the context it misses.
    if (this.port !== null) this.post('setContext', { key, context }).catch(() => undefined);
  }

  call<C extends Exclude<SolverCall, 'setContext'>>(
    call: C,
    input: SolverCalls[C]['input'],
  ): Promise<SolverCalls[C]['output']> {
    return this.post(call, input);
  }

  close(): void {
    this.fail('The solver was closed');
  }

  private post<C extends SolverCall>(
    call: C,
    input: SolverCalls[C]['input'],
  ): Promise<SolverCalls[C]['output']> {
    const port = this.port ?? this.open();
    this.serial += 1;
    const serial = this.serial;
    return new Promise<SolverCalls[C]['output']>((resolve, reject) => {
      this.waiting.set(serial, { resolve: resolve, reject });
      port.postMessage({ serial, call, input } as SolverRequest);
    });
  }

  private open(): SolverPort {
    const port = this.spawn();
    this.port = port;
    port.addEventListener('message', ({ data }) => {
      if (this.port === port) this.receive(data);
    });
    port.addEventListener('error', ({ message }) => {
      if (this.port === port) this.fail(`The solver stopped: ${message ?? 'no reason given'}`);
    });
    for (const [key, context] of this.contexts)
      this.post('setContext', { key, context }).catch(() => undefined);
    return port;
  }

  private receive(reply: SolverReply): void {
    const waiting = this.waiting.get(reply.serial);
    this.waiting.delete(reply.serial);
    if (waiting === undefined) return;
    if (reply.ok) waiting.resolve(reply.output as never);
    else waiting.reject(new Error(reply.message));
  }

  private fail(message: string): void {
    this.port?.terminate();
    this.port = null;
    const left = [...this.waiting.values()];
    this.waiting.clear();
    for (const { reject } of left) reject(new Error(message));
  }
}

export function spawnSolverWorker(): SolverPort {
  return new Worker(new URL('./solver-worker.ts', import.meta.url), { type: 'module', name: 'solver' });
}
