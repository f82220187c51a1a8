export interface LatestState<I, O> {
  /** What was asked for last. */
  readonly newest: I | null;
  /** The latest answer and what it answers; current only while `input` is the newest. */
  readonly shown: { readonly input: I; readonly output: O; readonly elapsedMs: number } | null;
  readonly error: { readonly input: I; readonly message: string } | null;
}

/**
 * Runs requests one at a time; while one runs only the newest of those that came waits, the others are dropped.
 * Newest edit wins: an answer is kept with its input, so that an overtaken one can never pass for current.
 * `quietMs`: waits until no request came for so long.
 */
export class LatestOnly<I, O> {
  private state: LatestState<I, O> = { newest: null, shown: null, error: null };
  private waiting: { input: I; since: number } | null = null;
  private running = false;
  private timer: ReturnType<typeof setTimeout> | null = null;
  private readonly listeners = new Set<() => void>();
  private readonly run: (input: I) => Promise<O>;
  private readonly quietMs: number;

  constructor(run: (input: I) => Promise<O>, quietMs = 0) {
    this.run = run;
    this.quietMs = quietMs;
  }

  readonly getState = (): LatestState<I, O> => this.state;

  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => {
      this.listeners.delete(listener);
    };
  };

  request(input: I): void {
    if (this.state.newest === input) return;
    this.set({ ...this.state, newest: input });
    this.waiting = { input, since: performance.now() };
    if (this.quietMs === 0) {
      this.next();
      return;
    }
    if (this.timer !== null) clearTimeout(this.timer);
    this.timer = setTimeout(() => {
      this.timer = null;
      this.next();
    }, this.quietMs);
  }

  private next(): void {
    const job = this.waiting;
    if (this.running || job === null || this.timer !== null) return;
    this.waiting = null;
    this.running = true;
    this.run(job.input).then(
      (output) => {
        this.finish({
          ...this.state,
          shown: { input: job.input, output, elapsedMs: performance.now() - job.since },
          error: null,
        });
      },
      (error: unknown) => {
        const message = error instanceof Error ? error.message : String(error);
        this.finish({ ...this.state, error: { input: job.input, message } });
      },
    );
  }

  private finish(state: LatestState<I, O>): void {
    this.running = false;
    this.set(state);
    this.next();
  }

  private set(state: LatestState<I, O>): void {
    this.state = state;
    for (const listener of this.listeners) listener();
  }
}
