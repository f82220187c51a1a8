import { createHmac, timingSafeEqual } from 'node:crypto';
import type { Context } from '../../context.ts';
import { keyFor } from './keys.ts';

/** The token a page must send with every change; bound to the family of its session. */
export function csrfTokenOf(context: Context, familyId: string): string {
  return createHmac('sha256', keyFor(context, 'csrf')).update(familyId).digest('base64url');
}

export function csrfMatches(context: Context, familyId: string, given: string | undefined): boolean {
  const expected = Buffer.from(csrfTokenOf(context, familyId));
  const sent = Buffer.from(given ?? '');
  return sent.length === expected.length && timingSafeEqual(sent, expected);
}
