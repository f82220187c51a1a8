import { SolverInputError, requireNumber } from '../input-error.ts';
import { brentMaximum } from '../numerics/maximum.ts';
import { emptyState } from '../section/solve-section.ts';
import type { Rotor } from './rotor.ts';
import { solveUnit } from './solve-point.ts';

/** Coefficients of a curve; NaN marks a point some section of which has no solution. */
export interface CurveResult {
  readonly cp: Float64Array;
  readonly ct: Float64Array;
  readonly cq: Float64Array;
}

/** CP, CT and CQ at each tip-speed ratio (≥ 0) for one pitch; each point is the same as solvePoint's. */
export function solveCurve(
  rotor: Rotor,
  { pitchDeg, tipSpeedRatios }: { pitchDeg: number; tipSpeedRatios: ArrayLike<number> },
): CurveResult {
  requireNumber('pitchDeg', pitchDeg, -360, 360);
  const n = tipSpeedRatios.length;
  const result = { cp: new Float64Array(n), ct: new Float64Array(n), cq: new Float64Array(n) };
  const area = Math.PI * rotor.tipRadiusM ** 2;
  const scratch = emptyState();
  for (let i = 0; i < n; i += 1) {
    const lambda = requireNumber(`tipSpeedRatios[${i}]`, tipSpeedRatios[i] ?? NaN, 0);
    const loads = solveUnit(rotor, lambda, pitchDeg, scratch);
    const cq = loads.torque / (area * rotor.tipRadiusM);
    result.cq[i] = cq;
    result.cp[i] = cq * lambda;
    result.ct[i] = loads.thrust / area;
  }
  return result;
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
  const scratch = emptyState();
  const area = Math.PI * rotor.tipRadiusM ** 2;
  const cpAt = (lambda: number) => {
    const cp = (solveUnit(rotor, lambda, pitchDeg, scratch).torque * lambda) / (area * rotor.tipRadiusM);
    return Number.isFinite(cp) ? cp : -Infinity;
  };
  let best = 0;
  let bestCp = -Infinity;
  for (let i = 0; i <= COARSE; i += 1) {
    const cp = cpAt(at(i));
    if (cp > bestCp) {
      best = i;
      bestCp = cp;
    }
  }
  if (bestCp === -Infinity) return null;
  const top = brentMaximum(cpAt, at(Math.max(0, best - 1)), at(Math.min(COARSE, best + 1)), 1e-7);
  return {
    tipSpeedRatio: top.x,
    cp: top.value,
    ct: solveUnit(rotor, top.x, pitchDeg, scratch).thrust / area,
  };
}
