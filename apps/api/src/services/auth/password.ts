import bcrypt from 'bcryptjs';
import type { Context } from '../../context.ts';

/** bcrypt reads 72 bytes; the contract lets no longer password be set, and a longer one is never the right one. */
const MAX_BYTES = 72;

export function hashPassword(context: Context, password: string): Promise<string> {
  return bcrypt.hash(password, context.config.passwordCost);
}

/** A hash of the usual form that no password is known for; at the same cost it takes as long to compare. */
const decoyHash = (cost: number): string =>
  `$2b$${String(cost).padStart(2, '0')}$Ro0CUfOqk6cXEKf3dyaM7OhSCvnwM9s4wIX9JeLapehKK5YdLxKcm`;

/** Whether the password is the right one. Takes as long where there is no hash to hold it against. */
export async function passwordMatches(
  context: Context,
  password: string,
  hash: string | null,
): Promise<boolean> {
  const equal = await bcrypt.compare(password, hash ?? decoyHash(context.config.passwordCost));
  return equal && hash !== null && Buffer.byteLength(password) <= MAX_BYTES;
}
