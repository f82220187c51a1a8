/** Local planform of an optimum rotor: inflow angle (rad) and chord (m) at a radius. */
export interface OptimumSection {
  readonly phi: number;
  readonly chordM: number;
}

export interface PlanformInput {
  readonly bladeCount: number;
  readonly tipRadiusM: number;
  readonly tipSpeedRatio: number;
  readonly lift: number;
}

/** Betz's optimum, a = 1/3 without wake rotation: φ = atan(2/3λr), c = 8πr sinφ/(3Bclλr) (Manwell 2009, ch. 3, from memory). */
export function betzSection(
  { bladeCount, tipRadiusM, tipSpeedRatio, lift }: PlanformInput,
  radiusM: number,
): OptimumSection {
  const local = (tipSpeedRatio * radiusM) / tipRadiusM;
  const phi = Math.atan(2 / (3 * local));
  return { phi, chordM: (8 * Math.PI * radiusM * Math.sin(phi)) / (3 * bladeCount * lift * local) };
}

/** Optimum with wake rotation (Glauert 1935; Schmitz): φ = (2/3)atan(1/λr), c = 8πr(1 − cosφ)/(Bcl). */
export function schmitzSection(
  { bladeCount, tipRadiusM, tipSpeedRatio, lift }: PlanformInput,
  radiusM: number,
): OptimumSection {
  const local = (tipSpeedRatio * radiusM) / tipRadiusM;
  const phi = (2 / 3) * Math.atan(1 / local);
  return { phi, chordM: (8 * Math.PI * radiusM * (1 - Math.cos(phi))) / (bladeCount * lift) };
}
