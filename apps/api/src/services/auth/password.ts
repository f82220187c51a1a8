import bcrypt from 'bcryptjs';
import type { Context } from '../../context.ts';

/** bcrypt reads 72 bytes; the contract lets no longer password be set, and a longer one is never the right one. */
const MAX_BYTES = 72;

export function hashPassword(context: Context, password: string): Promise<string> {
  return bcrypt.hash(password, context.config.passwordCost);
}

const decoys = new Map<number, Promise<string>>();

function decoyHash(cost: number): Promise<string> {
  const known = decoys.get(cost);
  if (known !== undefined) return known;
  const made = bcrypt.hash('no person has this password', cost);
  decoys.set(cost, made);
  return made;
}

/** Whether the password is the right one. Takes as long where there is no hash to hold it against. */
export async function passwordMatches(
  context: Context,
  password: string,
  hash: string | null,
): Promise<boolean> {
  const equal = await bcrypt.compare(password, hash ?? (await decoyHash(context.config.passwordCost)));
  return equal && hash !== null && Buffer.byteLength(password) <= MAX_BYTES;
}
