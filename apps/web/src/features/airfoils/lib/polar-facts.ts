import type { PolarData } from '@tipward/contract';

export interface PolarFacts {
  readonly maxCl: number;
  readonly alphaAtMaxClDeg: number;
  readonly minCd: number;
  readonly maxGlideRatio: number | null;
  /** Slope of lift near α = 0 as a share of the thin-airfoil value 2π per radian; null without points there. */
  readonly liftSlopeShare: number | null;
  readonly concerns: readonly string[];
}

/** Attached flow is looked at between these angles (°). */
const ATTACHED = { from: -3, to: 5 };
const WIDEST_STEP_DEG = 2;
const SLOPE = { least: 0.75, most: 1.15 };

/** Least-squares slope of cl over α in the attached range, per radian. */
function liftSlope({ alphaDeg, cl }: PolarData): number | null {
  const points = alphaDeg.flatMap((alpha, i) =>
    alpha >= ATTACHED.from && alpha <= ATTACHED.to ? [[(alpha * Math.PI) / 180, cl[i] ?? 0] as const] : [],
  );
  if (points.length < 2) return null;
  const meanX = points.reduce((sum, [x]) => sum + x, 0) / points.length;
  const meanY = points.reduce((sum, [, y]) => sum + y, 0) / points.length;
  const top = points.reduce((sum, [x, y]) => sum + (x - meanX) * (y - meanY), 0);
  return top / points.reduce((sum, [x]) => sum + (x - meanX) ** 2, 0);
}

function widestStep({ alphaDeg }: PolarData): { step: number; at: number } {
  return alphaDeg.reduce(
    (widest, alpha, i) => {
      const before = alphaDeg[i - 1];
      const inside = before !== undefined && before >= -10 && alpha <= 20;
      return inside && alpha - before > widest.step ? { step: alpha - before, at: before } : widest;
    },
    { step: 0, at: 0 },
  );
}

function concernsOf(polar: PolarData, slopeShare: number | null, lifts: boolean): string[] {
  const { alphaDeg, cl, cd } = polar;
  const concerns: string[] = [];
  const drag = cd.findIndex((value) => value <= 0);
  if (drag >= 0) concerns.push(`cd is not above 0 at α = ${String(alphaDeg[drag])}°.`);
  if (lifts && slopeShare !== null && (slopeShare < SLOPE.least || slopeShare > SLOPE.most))
    concerns.push(`The lift slope is ${(slopeShare * 100).toFixed(0)} % of 2π per radian.`);
  const gap = widestStep(polar);
  if (gap.step > WIDEST_STEP_DEG)
    concerns.push(`A gap of ${gap.step.toFixed(1)}° begins at α = ${String(gap.at)}°.`);
  const whole = alphaDeg[0] === -180 && alphaDeg.at(-1) === 180;
  if (whole && Math.abs((cl[0] ?? 0) - (cl.at(-1) ?? 0)) > 0.01) concerns.push('cl does not close at ±180°.');
  return concerns;
}

/** Lift falls by this much past the peak before it counts as stall; less is scatter. */
const STALL_DROP = 0.02;

/** Index of the first maximum of lift above α = 0: the rise of a stalled flat plate further on is no maximum of use. */
function liftPeak({ alphaDeg, cl }: PolarData): number {
  let best = Math.max(
    0,
    alphaDeg.findIndex((alpha) => alpha >= 0),
  );
  for (let i = best + 1; i < alphaDeg.length; i += 1) {
    if ((cl[i] ?? 0) > (cl[best] ?? 0)) best = i;
    if ((cl[i] ?? 0) < (cl[best] ?? 0) - STALL_DROP) break;
  }
  return best;
}

/** What makes a polar worth trusting, or not. `thicknessPct` 100 is a cylinder, which lifts nothing. */
export function polarFacts(polar: PolarData, thicknessPct: number): PolarFacts {
  const near = polar.alphaDeg.flatMap((alpha, i) => (Math.abs(alpha) <= 30 ? [i] : []));
  const peak = liftPeak(polar);
  const ratios = near.flatMap((i) => {
    const drag = polar.cd[i] ?? 0;
    return drag > 0 ? [(polar.cl[i] ?? 0) / drag] : [];
  });
  const slope = liftSlope(polar);
  const liftSlopeShare = slope === null ? null : slope / (2 * Math.PI);
  return {
    maxCl: polar.cl[peak] ?? 0,
    alphaAtMaxClDeg: polar.alphaDeg[peak] ?? 0,
    minCd: Math.min(...polar.cd),
    maxGlideRatio: ratios.length === 0 ? null : Math.max(...ratios),
    liftSlopeShare,
    concerns: concernsOf(polar, liftSlopeShare, thicknessPct < 100),
  };
}
