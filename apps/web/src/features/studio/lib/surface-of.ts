import type { DesignContent } from '@tipward/contract';
import { bladeSurface } from '@tipward/design-model';
import type { AirfoilData, BladeSurface } from '@tipward/design-model';

/** The lofted blade, or null where there is nothing to loft. */
export function surfaceOf(
  content: DesignContent | null,
  airfoils: readonly AirfoilData[] | null,
): BladeSurface | null {
  if (content === null || airfoils === null || airfoils.length === 0) return null;
  return bladeSurface(content, airfoils);
}
