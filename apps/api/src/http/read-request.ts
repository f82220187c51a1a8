import type { Request } from 'express';
import { faultsOf, type Fault, type Operation } from '@tipward/contract';
import type { z } from 'zod';
import { AppError, invalid } from './app-error.ts';
import { unstorableText } from './unstorable-text.ts';

interface Read {
  readonly params: unknown;
  readonly query: unknown;
  readonly body: unknown;
}

function readPart(
  schema: z.ZodType | null,
  input: unknown,
  prefix: readonly string[],
  faults: Fault[],
): unknown {
  if (schema === null) return undefined;
  const parsed = schema.safeParse(input);
  if (parsed.success) return parsed.data;
  faults.push(...faultsOf(parsed.error, input, prefix));
  return undefined;
}

function requireJson(request: Request): void {
  const hasBody =
    request.headers['transfer-encoding'] !== undefined || Number(request.headers['content-length'] ?? 0) > 0;
  if (hasBody && request.is('application/json') === false)
    throw new AppError('unsupported-media-type', 'Send the body as application/json.');
}

/**
 * Address, query and body as the contract reads them.
 * @throws AppError `invalid` with every fault of all three parts; `not-found` where an identifier in the address is none.
 */
export function readRequest(operation: Operation, request: Request): Read {
  const inAddress: Fault[] = [];
  const params = readPart(operation.params, request.params, [], inAddress);
  if (inAddress.length > 0)
    throw new AppError('not-found', 'Nothing has this address.', { faults: inAddress });

  const faults: Fault[] = [];
  const query = readPart(operation.query, request.query, [], faults);
  if (operation.body !== null) requireJson(request);
  const body = readPart(operation.body, request.body, [], faults);
  if (operation.body !== null) faults.push(...unstorableText(request.body));
  if (faults.length > 0) throw invalid(faults);
  return { params, query, body };
}

/** @throws AppError `precondition-required` when the contract asks for If-Match and none came. */
export function readIfMatch(operation: Operation, request: Request): string {
  if (operation.ifMatch !== true) return '';
  const given = request.headers['if-match'];
  if (given === undefined || given.trim() === '')
    throw new AppError('precondition-required', 'Send If-Match with the ETag of the state that is edited.');
  return given.trim();
}
