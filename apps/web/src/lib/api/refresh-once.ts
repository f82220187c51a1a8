import { refreshSession } from '@tipward/contract';
import type { Session } from '@tipward/contract';
import { rememberCsrfToken } from './csrf-token.ts';
import { sendRequest } from './request.ts';

let underway: Promise<boolean> | null = null;

async function refresh(): Promise<boolean> {
  const response = await sendRequest(refreshSession, {});
  if (!response.ok) {
    rememberCsrfToken(null);
    return false;
  }
  rememberCsrfToken(((await response.json()) as Session).csrfToken);
  return true;
}

/** Renews the session; requests that fail at the same time share one renewal. False: the session has ended. */
export function refreshOnce(): Promise<boolean> {
  underway ??= refresh().finally(() => {
    underway = null;
  });
  return underway;
}
