import type { Cookies } from '../../http/cookies.ts';
import { ACCESS_SECONDS } from './access-token.ts';

export const ACCESS_COOKIE = 'tipward_session';
export const REFRESH_COOKIE = 'tipward_refresh';
const REFRESH_PATH = '/api/v1/auth';
export const REFRESH_SECONDS = 14 * 24 * 3600;

export interface TokenPair {
  readonly access: string;
  readonly refresh: string;
}

export function writeSessionCookies(cookies: Cookies, pair: TokenPair): void {
  cookies.write(ACCESS_COOKIE, pair.access, { path: '/', maxAgeSeconds: ACCESS_SECONDS });
  cookies.write(REFRESH_COOKIE, pair.refresh, { path: REFRESH_PATH, maxAgeSeconds: REFRESH_SECONDS });
}

export function clearSessionCookies(cookies: Cookies): void {
  cookies.clear(ACCESS_COOKIE, '/');
  cookies.clear(REFRESH_COOKIE, REFRESH_PATH);
}
