import { SolverInputError } from '../input-error.ts';
import type { PolarTable } from './polar.ts';

function valueAt(x: ArrayLike<number>, y: ArrayLike<number>, at: number): number {
  const n = x.length;
  if (at <= (x[0] ?? 0)) return y[0] ?? 0;
  if (at >= (x[n - 1] ?? 0)) return y[n - 1] ?? 0;
  let low = 0;
  let high = n - 1;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if ((x[middle] ?? 0) <= at) low = middle;
    else high = middle;
  }
  const x0 = x[low] ?? 0;
  return (y[low] ?? 0) + ((at - x0) / ((x[high] ?? 0) - x0)) * ((y[high] ?? 0) - (y[low] ?? 0));
}

function sameGrid(a: ArrayLike<number>, b: ArrayLike<number>): boolean {
  if (a.length !== b.length) return false;
  for (let i = 0; i < a.length; i += 1) if (a[i] !== b[i]) return false;
  return true;
}

/**
 * Both tables on the union of their angles, mixed linearly: (1 − weightB)·a + weightB·b, weightB in [0, 1]. Beyond its own rows a
 * table keeps its end values. The moment is mixed where both have it, else left out.
 */
export function blendPolars(a: PolarTable, b: PolarTable, weightB: number): PolarTable {
  if (!(weightB >= 0 && weightB <= 1)) throw new SolverInputError('weightB', weightB, 'a number from 0 to 1');
  const same = sameGrid(a.alphaDeg, b.alphaDeg);
  const grid = same
    ? Float64Array.from(a.alphaDeg)
    : Float64Array.from(new Set([...Array.from(a.alphaDeg), ...Array.from(b.alphaDeg)])).sort();
  const mix = (p: ArrayLike<number>, q: ArrayLike<number>) =>
    same
      ? grid.map((_, i) => (p[i] ?? 0) + weightB * ((q[i] ?? 0) - (p[i] ?? 0)))
      : grid.map((at) => (1 - weightB) * valueAt(a.alphaDeg, p, at) + weightB * valueAt(b.alphaDeg, q, at));
  const moment = a.cm !== undefined && b.cm !== undefined ? { cm: mix(a.cm, b.cm) } : {};
  return { alphaDeg: grid, cl: mix(a.cl, b.cl), cd: mix(a.cd, b.cd), ...moment };
}

export interface ReynoldsTable {
  readonly reynolds: number;
  readonly table: PolarTable;
}

/**
 * The polar at a Reynolds number, linear in log Re between the two nearest of an ascending set; outside the set its end is
 * taken and `outside` is true.
 */
export function interpolateReynolds(
  set: readonly ReynoldsTable[],
  reynolds: number,
): { table: PolarTable; outside: boolean } {
  const first = set[0];
  const last = set.at(-1);
  if (first === undefined || last === undefined)
    throw new SolverInputError('set', 'empty', 'at least one polar');
  set.forEach((entry, i) => {
    const before = set[i - 1]?.reynolds ?? 0;
    if (!(entry.reynolds > 0 && entry.reynolds >= before))
      throw new SolverInputError(`set[${i}].reynolds`, entry.reynolds, `above 0 and at least ${before}`);
  });
  if (!(reynolds > 0)) throw new SolverInputError('reynolds', reynolds, 'a number above 0');
  if (reynolds <= first.reynolds) return { table: first.table, outside: reynolds < first.reynolds };
  if (reynolds >= last.reynolds) return { table: last.table, outside: reynolds > last.reynolds };
  const above = set.findIndex((entry) => entry.reynolds > reynolds);
  const low = set[above - 1] ?? first;
  const high = set[above] ?? last;
  const weight = Math.log(reynolds / low.reynolds) / Math.log(high.reynolds / low.reynolds);
  return { table: blendPolars(low.table, high.table, weight), outside: false };
}
