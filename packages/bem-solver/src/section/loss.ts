const TWO_OVER_PI = 2 / Math.PI;

/** Prandtl's factor (2/π)·acos(e^−f) for f ≥ 0 (Prandtl 1919; Glauert 1935). Near 0 it goes as (2/π)√(2f). */
export function prandtlFactor(f: number): number {
  if (f <= 0) return 0;
  if (f > 36) return 1;
  // acos(e^−f) = atan2(√(1 − e^−2f), e^−f) keeps its digits for small f.
  const e = Math.exp(-f);
  return TWO_OVER_PI * Math.atan2(Math.sqrt(-Math.expm1(-2 * f)), e);
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
