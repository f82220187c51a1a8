import type { Request, Response } from 'express';

interface CookieOptions {
  readonly path: string;
  readonly maxAgeSeconds: number;
}

/** The cookies of one request: read what came, write what goes. All of them httpOnly and SameSite=Strict. */
export interface Cookies {
  read: (name: string) => string | null;
  write: (name: string, value: string, options: CookieOptions) => void;
  clear: (name: string, path: string) => void;
}

function parseCookies(header: string | undefined): ReadonlyMap<string, string> {
  const found = new Map<string, string>();
  for (const pair of (header ?? '').split(';')) {
    const at = pair.indexOf('=');
    if (at > 0) {
      const name = pair.slice(0, at).trim();
      // The first of two cookies of one name has the more specific path (RFC 6265, 5.4).
      if (!found.has(name)) found.set(name, pair.slice(at + 1).trim());
    }
  }
  return found;
}

export function cookiesOf(request: Request, response: Response, secure: boolean): Cookies {
  const sent = parseCookies(request.headers.cookie);
  const shared = { httpOnly: true, sameSite: 'strict', secure } as const;
  return {
    read: (name) => sent.get(name) ?? null,
    write: (name, value, { path, maxAgeSeconds }) => {
      response.cookie(name, value, { ...shared, path, maxAge: maxAgeSeconds * 1000 });
    },
    clear: (name, path) => {
      response.clearCookie(name, { ...shared, path });
    },
  };
}
