import { SolverInputError, requireNumber } from '../input-error.ts';
import { brentMaximum } from '../numerics/maximum.ts';
import { newSectionSolver } from '../section/section-solver.ts';
import type { Rotor } from './rotor.ts';
import type { PointStatus } from './solve-point.ts';
import { addCurve, LOAD_PLACES, takeElement, THRUST, TORQUE, unitLoads } from './unit-loads.ts';

/** Coefficients of a curve; NaN, and the status, mark a point some section of which has no solution. */
export interface CurveResult {
  readonly cp: Float64Array;
  readonly ct: Float64Array;
  readonly cq: Float64Array;
  readonly statuses: readonly PointStatus[];
}

const solver = newSectionSolver();

/**
 * CP, CT and CQ at each tip-speed ratio (≥ 0) for one pitch (°); each point is the same as solvePoint's. Each element's
 * balance is tabulated once and serves every ratio.
 */
export function solveCurve(
  rotor: Rotor,
  { pitchDeg, tipSpeedRatios }: { pitchDeg: number; tipSpeedRatios: ArrayLike<number> },
): CurveResult {
  requireNumber('pitchDeg', pitchDeg, -360, 360);
  const ratios = Float64Array.from(tipSpeedRatios);
  ratios.forEach((lambda, i) => requireNumber(`tipSpeedRatios[${i}]`, lambda, 0));
  const loads = new Float64Array(LOAD_PLACES * ratios.length);
  const pitch = (pitchDeg * Math.PI) / 180;
  for (const element of rotor.elements) {
    if (takeElement(rotor, element, pitch, solver)) addCurve(rotor, element, solver, ratios, loads);
  }
  const load = (i: number, place: number) => loads[LOAD_PLACES * i + place] as number;
  const area = Math.PI * rotor.tipRadiusM ** 2;
  const cq = ratios.map((_, i) => load(i, TORQUE) / (area * rotor.tipRadiusM));
  return {
    cp: cq.map((value, i) => value * (ratios[i] ?? NaN)),
    ct: ratios.map((_, i) => load(i, THRUST) / area),
    cq,
    statuses: Array.from(cq, (value) => (Number.isNaN(value) ? 'sections-unsolved' : 'converged')),
  };
}

const COARSE = 24;

/**
 * The largest CP over λ at one pitch, refined by Brent's parabolic search to 1e-7 in λ around the best of a coarse march.
 * Null where no point of the march is solved.
 */
export function maximumCp(
  rotor: Rotor,
  { pitchDeg, lambdaMin, lambdaMax }: { pitchDeg: number; lambdaMin: number; lambdaMax: number },
): { tipSpeedRatio: number; cp: number; ct: number } | null {
  requireNumber('lambdaMin', lambdaMin, 0);
  if (!(lambdaMax > lambdaMin))
    throw new SolverInputError('lambdaMax', lambdaMax, `above lambdaMin, ${lambdaMin}`);
  const at = (i: number) => lambdaMin + ((lambdaMax - lambdaMin) * i) / COARSE;
  const area = Math.PI * rotor.tipRadiusM ** 2;
  const cpAt = (lambda: number) => {
    const cp =
      ((unitLoads(rotor, lambda, pitchDeg, solver)[TORQUE] as number) * lambda) / (area * rotor.tipRadiusM);
    return Number.isFinite(cp) ? cp : -Infinity;
  };
  // The march shares the tabulated balances of one curve; only the search around its best solves point by point.
  const march = solveCurve(rotor, {
    pitchDeg,
    tipSpeedRatios: Array.from({ length: COARSE + 1 }, (_, i) => at(i)),
  });
  let best = 0;
  let bestCp = -Infinity;
  march.cp.forEach((cp, i) => {
    if (cp > bestCp) {
      best = i;
      bestCp = cp;
    }
  });
  if (bestCp === -Infinity) return null;
  const top = brentMaximum(cpAt, at(Math.max(0, best - 1)), at(Math.min(COARSE, best + 1)), 1e-7);
  return {
    tipSpeedRatio: top.x,
    cp: top.value,
    ct: (unitLoads(rotor, top.x, pitchDeg, solver)[THRUST] as number) / area,
  };
}
