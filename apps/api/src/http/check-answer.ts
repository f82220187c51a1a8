import { isDeepStrictEqual } from 'node:util';
import type { Operation } from '@tipward/contract';

/**
 * Test mode: an answer must be what the contract promises, no less and no more.
 * @throws Error naming what differs.
 */
export function checkAnswer(operation: Operation, body: unknown): void {
  if (operation.response === null) {
    if (body !== undefined)
      throw new Error(`${operation.id} answers with a body that the contract does not have`);
    return;
  }
  const wire: unknown = JSON.parse(JSON.stringify(body));
  const parsed = operation.response.safeParse(wire);
  if (!parsed.success)
    throw new Error(`${operation.id} does not answer as the contract says: ${parsed.error.message}`);
  if (!isDeepStrictEqual(JSON.parse(JSON.stringify(parsed.data)), wire))
    throw new Error(`${operation.id} answers with fields that the contract does not have`);
}
