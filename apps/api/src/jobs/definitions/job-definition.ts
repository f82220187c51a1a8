import type { z } from 'zod';

/** What a job is called and carries. Senders import this and never the handler. */
export interface JobDefinition<P extends z.ZodType = z.ZodType> {
  /** Stable: it stands in the queue of running installations. */
  readonly id: string;
  readonly payload: P;
  readonly retryLimit: number;
  /** Seconds before the first retry; each later one waits about twice as long. */
  readonly retryDelay: number;
  readonly expireInSeconds: number;
}
