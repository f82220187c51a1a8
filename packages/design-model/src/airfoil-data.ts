import type { PolarData } from '@tipward/contract';

/** An airfoil as the model needs it; the contract's Airfoil fits. `outline`: trailing edge, upper side, leading edge, lower side; chord 1. */
export interface AirfoilData {
  readonly name: string;
  readonly thicknessPct: number;
  readonly outline: readonly (readonly [number, number])[];
  readonly polars: readonly PolarData[];
  readonly polarSetHash: string;
}

/** Two airfoils and the share of the second: how a relative thickness is met. */
export interface AirfoilMix {
  readonly a: AirfoilData;
  readonly b: AirfoilData;
  readonly weightB: number;
}

/**
 * The airfoil, or pair of airfoils next in thickness, that a station stands for. A thickness beyond the thinnest or
 * thickest airfoil takes that one alone. Throws where the design has no airfoil.
 */
export function mixFor(
  airfoils: readonly AirfoilData[],
  thicknessPct: number,
  named: string | null,
): AirfoilMix {
  const own = airfoils.find((foil) => foil.name === named);
  if (own !== undefined) return { a: own, b: own, weightB: 0 };
  const sorted = [...airfoils].sort((x, y) => x.thicknessPct - y.thicknessPct);
  const first = sorted[0];
  const last = sorted.at(-1);
  if (first === undefined || last === undefined)
    throw new RangeError('The design has no airfoil; allowed: 1 to 24');
  if (thicknessPct <= first.thicknessPct) return { a: first, b: first, weightB: 0 };
  if (thicknessPct >= last.thicknessPct) return { a: last, b: last, weightB: 0 };
  const above = sorted.findIndex((foil) => foil.thicknessPct >= thicknessPct);
  const a = sorted[above - 1] ?? first;
  const b = sorted[above] ?? last;
  return { a, b, weightB: (thicknessPct - a.thicknessPct) / (b.thicknessPct - a.thicknessPct) };
}
