import type { DraftStation } from '@tipward/contract';

/** Airfoils that stations name but that the library does not hold. */
export function unknownAirfoils(rows: readonly DraftStation[], known: readonly string[]): string[] {
  const named = rows.flatMap(({ airfoil }) => (airfoil === null ? [] : [airfoil]));
  return [...new Set(named)].filter((name) => !known.includes(name));
}
