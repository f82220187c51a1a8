import { createHash } from 'node:crypto';
import type { AirfoilInput } from '@tipward/contract';
import { canonicalJson } from '@tipward/design-model';

/** SHA-256 over all of an airfoil that a result or a shape can depend on; its name and note are left out. */
export function hashPolarSet({ thicknessPct, outline, polars }: AirfoilInput): string {
  return createHash('sha256').update(canonicalJson({ thicknessPct, outline, polars })).digest('hex');
}
