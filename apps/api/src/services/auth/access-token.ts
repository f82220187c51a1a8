import jwt from 'jsonwebtoken';
import { z } from 'zod';
import type { Context } from '../../context.ts';
import { keyFor } from './keys.ts';

export const ACCESS_SECONDS = 600;
const ISSUER = 'tipward';

const claims = z.object({ sub: z.uuid(), fam: z.uuid() });

export interface Access {
  readonly personId: string;
  readonly familyId: string;
}

export function signAccessToken(context: Context, access: Access): string {
  return jwt.sign({ fam: access.familyId }, keyFor(context, 'access'), {
    algorithm: 'HS256',
    subject: access.personId,
    issuer: ISSUER,
    expiresIn: ACCESS_SECONDS,
  });
}

/** What a token says, or null when it is forged, expired or no token at all. */
export function readAccessToken(context: Context, token: string): Access | null {
  try {
    const payload = jwt.verify(token, keyFor(context, 'access'), { algorithms: ['HS256'], issuer: ISSUER });
    const read = claims.safeParse(payload);
    return read.success ? { personId: read.data.sub, familyId: read.data.fam } : null;
  } catch (error) {
    if (error instanceof jwt.JsonWebTokenError) return null;
    throw error;
  }
}
