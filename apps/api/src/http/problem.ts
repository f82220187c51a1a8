import type { Response } from 'express';
import type { Problem } from '@tipward/contract';
import { PROBLEMS, type AppError } from './app-error.ts';

/** Problem details by RFC 9457. The type is a stable name rather than an address: nothing has to answer there. */
function problemOf(error: AppError, instance: string): Problem {
  const { status, title } = PROBLEMS[error.code];
  const { faults, current, currentETag } = error.particulars;
  return {
    type: `urn:tipward:problem:${error.code}`,
    title,
    status,
    detail: error.detail,
    instance,
    code: error.code,
    ...(faults === undefined ? {} : { faults: [...faults] }),
    ...(current === undefined ? {} : { current }),
    ...(currentETag === undefined ? {} : { currentETag }),
  };
}

export function sendProblem(response: Response, error: AppError, instance: string): void {
  const { retryAfterSeconds } = error.particulars;
  if (retryAfterSeconds !== undefined) response.set('Retry-After', String(retryAfterSeconds));
  response
    .status(PROBLEMS[error.code].status)
    .type('application/problem+json')
    .send(JSON.stringify(problemOf(error, instance)));
}
