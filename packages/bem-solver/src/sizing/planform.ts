import { requireNumber } from '../input-error.ts';

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

export interface Planform {
  readonly radiusM: Float64Array;
  readonly chordM: Float64Array;
  /** Inflow angle φ; twist follows by taking off the angle of attack. */
  readonly inflowRad: Float64Array;
}

function planform(
  section: (input: PlanformInput, radiusM: number) => OptimumSection,
  input: PlanformInput,
  radii: ArrayLike<number>,
): Planform {
  requireNumber('bladeCount', input.bladeCount, 1, 100);
  requireNumber('tipRadiusM', input.tipRadiusM, 0, Infinity, true);
  requireNumber('tipSpeedRatio', input.tipSpeedRatio, 0, 100, true);
  requireNumber('lift', input.lift, 0, 10, true);
  const radiusM = Float64Array.from(radii);
  radiusM.forEach((r, i) => requireNumber(`radii[${i}]`, r, 0, input.tipRadiusM, true));
  const sections = Array.from(radiusM, (r) => section(input, r));
  return {
    radiusM,
    chordM: Float64Array.from(sections, (s) => s.chordM),
    inflowRad: Float64Array.from(sections, (s) => s.phi),
  };
}

/** Betz's planform at radii (m) above 0 up to the tip radius. */
export function betzPlanform(input: PlanformInput, radii: ArrayLike<number>): Planform {
  return planform(betzSection, input, radii);
}

/** Schmitz's planform at radii (m) above 0 up to the tip radius. */
export function schmitzPlanform(input: PlanformInput, radii: ArrayLike<number>): Planform {
  return planform(schmitzSection, input, radii);
}
