import type { PointResult } from '../rotor/solve-point.ts';
import { SolverInputError } from '../input-error.ts';

/** Shear and bending moments of one blade at its stations, from the tip inboard (N, N·m). */
export interface SpanLoads {
  readonly radiusM: Float64Array;
  readonly normalShearN: Float64Array;
  readonly tangentialShearN: Float64Array;
  readonly flapMomentNm: Float64Array;
  readonly edgeMomentNm: Float64Array;
}

/** Piecewise linear load q over [r_i, r_i+1]: its force, and its moment about r_i. */
function panel(q0: number, q1: number, width: number): { force: number; moment: number } {
  return { force: 0.5 * (q0 + q1) * width, moment: (width * width * (q0 + 2 * q1)) / 6 };
}

/**
 * Cumulative shear and bending moment along the span of a solved point (its sections asked for), loads linear between
 * stations and falling to 0 at the tip radius. Throws SolverInputError where a section has no force.
 */
export function spanLoads(point: PointResult, tipRadiusM: number): SpanLoads {
  const sections = point.sections ?? [];
  if (sections.length === 0)
    throw new SolverInputError('point.sections', 'missing', 'a point solved with sections');
  const n = sections.length;
  const columns = () => new Float64Array(n);
  const loads = {
    radiusM: Float64Array.from(sections, (s) => s.radiusM),
    normalShearN: columns(),
    tangentialShearN: columns(),
    flapMomentNm: columns(),
    edgeMomentNm: columns(),
  };
  const force = (i: number, pick: 'normalForceNM' | 'tangentialForceNM') => {
    if (i >= n) return 0;
    const value = sections[i]?.[pick] ?? null;
    if (value === null) throw new SolverInputError(`point.sections[${i}].${pick}`, value, 'a solved section');
    return value;
  };
  const add = (pick: 'normalForceNM' | 'tangentialForceNM', shear: Float64Array, moment: Float64Array) => {
    for (let i = n - 1; i >= 0; i -= 1) {
      const width = (loads.radiusM[i + 1] ?? tipRadiusM) - (loads.radiusM[i] ?? 0);
      const { force: own, moment: ownMoment } = panel(force(i, pick), force(i + 1, pick), width);
      const outerShear = shear[i + 1] ?? 0;
      shear[i] = outerShear + own;
      moment[i] = (moment[i + 1] ?? 0) + outerShear * width + ownMoment;
    }
  };
  add('normalForceNM', loads.normalShearN, loads.flapMomentNm);
  add('tangentialForceNM', loads.tangentialShearN, loads.edgeMomentNm);
  return loads;
}
