import type { Fault } from '@tipward/contract';

/** What may go wrong with a request; each code has one status and one title. */
export const PROBLEMS = {
  'malformed-json': { status: 400, title: 'The body is not readable JSON' },
  'malformed-address': { status: 400, title: 'The address is not readable' },
  'not-signed-in': { status: 401, title: 'Not signed in' },
  forbidden: { status: 403, title: 'Not allowed' },
  'not-found': { status: 404, title: 'Not found' },
  conflict: { status: 409, title: 'In conflict with what is recorded' },
  stale: { status: 412, title: 'Changed in the meantime' },
  'too-large': { status: 413, title: 'The body is too large' },
  'unsupported-media-type': { status: 415, title: 'The body is not JSON' },
  invalid: { status: 422, title: 'Not valid' },
  'precondition-required': { status: 428, title: 'The state it edits is not named' },
  'too-many-requests': { status: 429, title: 'Too many attempts' },
  internal: { status: 500, title: 'Something failed on the server' },
} as const;
export type ProblemCode = keyof typeof PROBLEMS;

interface Particulars {
  readonly faults?: readonly Fault[];
  /** On `stale`: the document as it stands and its ETag. */
  readonly current?: unknown;
  readonly currentETag?: string;
  readonly retryAfterSeconds?: number;
}

/** A refusal meant for the person who asked. `detail` is shown to them; what only the log may know is the `cause`. */
export class AppError extends Error {
  readonly code: ProblemCode;
  readonly detail: string;
  readonly particulars: Particulars;

  constructor(code: ProblemCode, detail: string, particulars: Particulars = {}, cause?: unknown) {
    super(`${code}: ${detail}`, { cause });
    this.name = 'AppError';
    this.code = code;
    this.detail = detail;
    this.particulars = particulars;
  }
}

export const notFound = (what: string): AppError => new AppError('not-found', `${what} does not exist.`);
export const forbidden = (detail: string): AppError => new AppError('forbidden', detail);
export const conflict = (detail: string): AppError => new AppError('conflict', detail);
export const invalid = (faults: readonly Fault[]): AppError =>
  new AppError(
    'invalid',
    faults.length === 1 ? 'One thing is wrong.' : `${faults.length} things are wrong.`,
    {
      faults,
    },
  );
