const TWO_OVER_PI = 2 / Math.PI;

/** (2/π)·acos(e^−f), exact; acos(e^−f) = atan2(√(1 − e^−2f), e^−f) keeps its digits for small f. */
function exactFactor(f: number): number {
  return TWO_OVER_PI * Math.atan2(Math.sqrt(-Math.expm1(-2 * f)), Math.exp(-f));
}

const CELLS = 2048;
const LAST_ROOT = 5.6;
const WIDTH = LAST_ROOT / CELLS;

/** Values and slopes (times the width) of the factor over u = √f, in which it is smooth down to 0. */
const VALUES = new Float64Array(CELLS + 2);
const SLOPES = new Float64Array(CELLS + 2);
for (let i = 0; i <= CELLS + 1; i += 1) {
  const u = i * WIDTH;
  VALUES[i] = exactFactor(u * u);
  // d/du (2/π)acos(e^−u²) = (4/π)·u·e^−u²/√(1 − e^−2u²)
  const slope =
    u === 0
      ? TWO_OVER_PI * Math.SQRT2
      : (2 * TWO_OVER_PI * u * Math.exp(-u * u)) / Math.sqrt(-Math.expm1(-2 * u * u));
  SLOPES[i] = slope * WIDTH;
}

/**
 * Prandtl's factor (2/π)·acos(e^−f) for f ≥ 0 (Prandtl 1919; Glauert 1935), from a table by cubic Hermite in √f: within
 * 1e-12 of the formula, several times faster in the solver's innermost loop. Near 0 it goes as (2/π)√(2f).
 */
export function prandtlFactor(f: number): number {
  if (f <= 0) return 0;
  const at = Math.sqrt(f) / WIDTH;
  if (at >= CELLS) return 1;
  const cell = at | 0;
  const t = at - cell;
  const y0 = VALUES[cell] as number;
  const y1 = VALUES[cell + 1] as number;
  const m0 = SLOPES[cell] as number;
  const m1 = SLOPES[cell + 1] as number;
  const rise = y1 - y0;
  return y0 + t * (m0 + t * (3 * rise - 2 * m0 - m1 + t * (m0 + m1 - 2 * rise)));
}

/** Geometry of an element's losses: F = F(tipShape/|sin φ|)·F(hubShape/|sin φ|); Infinity switches a loss off. */
export interface LossShape {
  /** (B/2)(R − r)/r */
  readonly tip: number;
  /** (B/2)(r − Rh)/Rh */
  readonly hub: number;
}

export function lossFactor(shape: LossShape, sinAbs: number): number {
  return prandtlFactor(shape.tip / sinAbs) * prandtlFactor(shape.hub / sinAbs);
}
