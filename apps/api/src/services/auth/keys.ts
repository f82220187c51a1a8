import { createHmac } from 'node:crypto';
import type { Context } from '../../context.ts';

/** A key for one use, derived from the secret: a value signed for one purpose is never taken for another. */
export function keyFor(context: Context, purpose: 'access' | 'csrf' | 'refresh'): Buffer {
  return createHmac('sha256', context.config.secret).update(`tipward ${purpose} key`).digest();
}
