import type { ErrorRequestHandler, RequestHandler } from 'express';
import { UniqueConstraintError } from 'sequelize';
import { databaseErrorCode } from '../db/in-transaction.ts';
import { locateJsonError } from '../json/locate-json-error.ts';
import { AppError } from './app-error.ts';
import { sendProblem } from './problem.ts';

interface BodyError {
  readonly type: string;
  readonly body?: unknown;
}

function isBodyError(error: unknown): error is BodyError {
  return (
    typeof error === 'object' && error !== null && typeof (error as { type?: unknown }).type === 'string'
  );
}

function malformed(error: BodyError): AppError {
  const fault = typeof error.body === 'string' ? locateJsonError(error.body) : null;
  const where = fault === null ? '' : ` Line ${fault.line}, column ${fault.column}: ${fault.message}.`;
  return new AppError('malformed-json', `The body is not readable JSON.${where}`);
}

function fromBodyParser(error: BodyError): AppError | null {
  switch (error.type) {
    case 'entity.parse.failed':
      return malformed(error);
    case 'entity.too.large':
      return new AppError('too-large', 'The body is larger than 4 MB.');
    case 'encoding.unsupported':
    case 'charset.unsupported':
      return new AppError('unsupported-media-type', 'Send the body as application/json in UTF-8.');
    case 'request.aborted':
    case 'request.size.invalid':
      return new AppError('malformed-json', 'The body ended early.');
    default:
      return null;
  }
}

function known(error: unknown): AppError {
  if (error instanceof AppError) return error;
  if (isBodyError(error)) {
    const found = fromBodyParser(error);
    if (found !== null) return found;
  }
  if (error instanceof URIError) return new AppError('malformed-address', 'The address is not readable.');
  if (error instanceof UniqueConstraintError)
    return new AppError(
      'conflict',
      'Another request recorded the same at this moment; look again.',
      {},
      error,
    );
  // Class 23: a trigger or constraint of the database refused what the services let through.
  if (databaseErrorCode(error)?.startsWith('23') === true)
    return new AppError(
      'conflict',
      'The database refused the change: it breaks a rule of the record.',
      {},
      error,
    );
  return new AppError(
    'internal',
    'The request failed; the log has the cause under the request’s number.',
    {},
    error,
  );
}

/** Every failure leaves as problem+json; what only the log may know stays in the log. */
export const handleErrors: ErrorRequestHandler = (error: unknown, request, response, next) => {
  if (response.headersSent) {
    next(error);
    return;
  }
  const problem = known(error);
  if (problem.cause !== undefined) request.log.error({ err: problem.cause }, problem.detail);
  sendProblem(response, problem, request.originalUrl);
};

export const answerNotFound: RequestHandler = (request, response) => {
  sendProblem(response, new AppError('not-found', 'Nothing has this address.'), request.originalUrl);
};
