import type { Fault, Problem } from '@tipward/contract';

/** What the API answered instead of what was asked for (RFC 9457), or 'unreachable' when no answer came. */
export class ApiProblem extends Error {
  readonly code: string;
  readonly status: number;
  readonly faults: readonly Fault[];
  /** On 412: the document as it stands now, and its ETag. */
  readonly current: unknown;
  readonly currentETag: string | null;

  constructor(given: Problem) {
    super(given.detail ?? given.title);
    this.name = 'ApiProblem';
    this.code = given.code;
    this.status = given.status;
    this.faults = given.faults ?? [];
    this.current = given.current;
    this.currentETag = given.currentETag ?? null;
  }
}

export const unreachable = () =>
  new ApiProblem({
    type: 'about:blank',
    title: 'The server cannot be reached.',
    detail: 'The server cannot be reached. Check the connection, then try again.',
    status: 0,
    code: 'unreachable',
  });

/** Whether an answer is a problem document; the API is ours, so its members beyond these are taken at their word. */
function isProblem(value: unknown): value is Problem {
  const given = value as Partial<Problem> | null;
  return typeof given === 'object' && typeof given?.code === 'string' && typeof given.title === 'string';
}

/** Reads a refusal; an answer that is no problem document (a proxy's page, say) is told as such. */
export async function readProblem(response: Response): Promise<ApiProblem> {
  const answer: unknown = await response.json().catch(() => null);
  if (isProblem(answer)) return new ApiProblem(answer);
  return new ApiProblem({
    type: 'about:blank',
    title: `The server answered ${String(response.status)} without saying why.`,
    status: response.status,
    code: 'unexplained',
  });
}

/** Any error as a problem a person can read. */
export function asProblem(error: unknown): ApiProblem {
  if (error instanceof ApiProblem) return error;
  return new ApiProblem({
    type: 'about:blank',
    title: error instanceof Error ? error.message : 'Something went wrong.',
    status: 0,
    code: 'unexpected',
  });
}
