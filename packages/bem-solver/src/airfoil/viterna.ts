import { SolverInputError, requireNumber } from '../input-error.ts';
import type { PolarTable } from './polar.ts';

const RAD = Math.PI / 180;

export interface ViternaOptions {
  /** Blade aspect ratio, up to 50; sets the drag at 90°: 1.11 + 0.018·AR. */
  readonly aspectRatio: number;
  /** Floor of the drag coefficient. */
  readonly leastDrag?: number;
  /** Degrees between the rows that are added. */
  readonly stepDeg?: number;
}

/** Constants of the extension that meets (α, cl, cd) at the matching angle. */
export function viternaConstants(alphaDeg: number, cl: number, cd: number, aspectRatio: number) {
  const s = Math.sin(alphaDeg * RAD);
  const c = Math.cos(alphaDeg * RAD);
  const largestDrag = 1.11 + 0.018 * aspectRatio;
  return {
    largestDrag,
    a1: largestDrag / 2,
    a2: (cl - largestDrag * s * c) * (s / (c * c)),
    b1: largestDrag,
    b2: (cd - largestDrag * s * s) / c,
  };
}

/** Lift and drag of the extension at an angle from the matching angle to 90°. */
export function viternaAt(
  constants: ReturnType<typeof viternaConstants>,
  alphaDeg: number,
): { cl: number; cd: number } {
  const s = Math.sin(alphaDeg * RAD);
  const c = Math.cos(alphaDeg * RAD);
  return {
    cl: constants.a1 * Math.sin(2 * alphaDeg * RAD) + (constants.a2 * c * c) / s,
    cd: constants.b1 * s * s + constants.b2 * c,
  };
}

/** Share of the lift kept where the section is met from behind or from below; common practice with this extension. */
const REVERSED = 0.7;

/**
 * A polar extended to the whole circle by Viterna and Corrigan, matched at the table's last row; the table itself stays.
 * Beyond 90° the lift is mirrored with a factor 0.7 and falls to 0 at 180°.
 * Source: L. A. Viterna and R. D. Corrigan, NASA workshop on large horizontal axis wind turbines, 1981 (from memory).
 * Throws where the table does not end between 0° and 90° and begin between −90° and 0°.
 */
export function extendViterna(table: PolarTable, options: ViternaOptions): PolarTable {
  const { aspectRatio, leastDrag = 0, stepDeg = 10 } = options;
  requireNumber('aspectRatio', aspectRatio, 0, 50, true);
  requireNumber('stepDeg', stepDeg, 0, 30, true);
  const n = table.alphaDeg.length;
  const high = table.alphaDeg[n - 1] ?? NaN;
  const low = table.alphaDeg[0] ?? NaN;
  if (!(high > 0 && high < 90)) throw new SolverInputError('alphaDeg', high, 'a last row between 0° and 90°');
  if (!(low < 0 && low > -90)) throw new SolverInputError('alphaDeg', low, 'a first row between −90° and 0°');
  const constants = viternaConstants(high, table.cl[n - 1] ?? 0, table.cd[n - 1] ?? 0, aspectRatio);
  const floor = (cd: number) => Math.max(cd, leastDrag);
  const rows: [number, number, number][] = [];
  const add = (alpha: number, cl: number, cd: number) => rows.push([alpha, cl, floor(cd)]);
  const upper = (alpha: number) => viternaAt(constants, Math.max(alpha, high));
  for (let i = 0; i < n; i += 1) add(table.alphaDeg[i] ?? 0, table.cl[i] ?? 0, table.cd[i] ?? 0);
  for (let alpha = Math.ceil((high + 1e-9) / stepDeg) * stepDeg; alpha <= 180; alpha += stepDeg) {
    if (alpha <= high) continue;
    if (alpha <= 90) add(alpha, upper(alpha).cl, upper(alpha).cd);
    else {
      const mirrored = upper(180 - alpha);
      const fade = 180 - alpha < high ? (180 - alpha) / high : 1;
      add(alpha, -REVERSED * mirrored.cl * fade, blunt(mirrored.cd, alpha, high, constants));
    }
  }
  for (let alpha = Math.floor((low - 1e-9) / stepDeg) * stepDeg; alpha >= -180; alpha -= stepDeg) {
    if (alpha >= low) continue;
    const turned = -alpha;
    if (turned <= 90) {
      const met = upper(turned);
      const share = turned < high ? (turned - -low) / Math.max(1e-9, high - -low) : 1;
      const start = table.cl[0] ?? 0;
      const startDrag = table.cd[0] ?? 0;
      add(
        alpha,
        turned < high ? start + share * (-REVERSED * met.cl - start) : -REVERSED * met.cl,
        turned < high ? startDrag + share * (met.cd - startDrag) : met.cd,
      );
    } else {
      const mirrored = upper(180 - turned);
      const fade = 180 - turned < high ? (180 - turned) / high : 1;
      add(alpha, REVERSED * mirrored.cl * fade, blunt(mirrored.cd, turned, high, constants));
    }
  }
  rows.sort((a, b) => a[0] - b[0]);
  return {
    alphaDeg: Float64Array.from(rows, (row) => row[0]),
    cl: Float64Array.from(rows, (row) => row[1]),
    cd: Float64Array.from(rows, (row) => row[2]),
  };
}

/** Drag near 180° falls to that of the section met tail first: twice the drag at the matching angle is never undercut to 0. */
function blunt(
  cd: number,
  alphaDeg: number,
  matchDeg: number,
  constants: ReturnType<typeof viternaConstants>,
): number {
  if (180 - alphaDeg >= matchDeg) return cd;
  const least = 0.02 * constants.largestDrag;
  return least + ((180 - alphaDeg) / matchDeg) * (cd - least);
}
