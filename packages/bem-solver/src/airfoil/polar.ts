import { SolverInputError } from '../input-error.ts';
import { pchipSlopes } from '../numerics/pchip.ts';

/** Coefficients against angle of attack in degrees; α ascends within [−180, 180]; columns of one length. */
export interface PolarTable {
  readonly alphaDeg: ArrayLike<number>;
  readonly cl: ArrayLike<number>;
  readonly cd: ArrayLike<number>;
}

export type PolarInterpolation = 'linear' | 'monotone-cubic';

/** A polar ready for the kernel: α in rad over one full turn and a bit, periodic. */
export interface Polar {
  readonly alpha: Float64Array;
  readonly cl: Float64Array;
  readonly cd: Float64Array;
  readonly clSlope: Float64Array | null;
  readonly cdSlope: Float64Array | null;
  /** Cell of each of `BUCKETS` even slices of the turn: the first candidate of a look-up. */
  readonly bucket: Int32Array;
}

const BUCKETS = 512;
const TURN = 2 * Math.PI;
const RAD = Math.PI / 180;

function checkTable(table: PolarTable): void {
  const n = table.alphaDeg.length;
  if (n < 2) throw new SolverInputError('alphaDeg', `${n} rows`, 'at least 2 rows');
  if (table.cl.length !== n)
    throw new SolverInputError('cl', `${table.cl.length} rows`, `${n} rows, as alphaDeg`);
  if (table.cd.length !== n)
    throw new SolverInputError('cd', `${table.cd.length} rows`, `${n} rows, as alphaDeg`);
  for (let i = 0; i < n; i += 1) {
    const alpha = table.alphaDeg[i] ?? NaN;
    if (!Number.isFinite(alpha) || alpha < -180 || alpha > 180)
      throw new SolverInputError(`alphaDeg[${i}]`, alpha, 'a number from −180 to 180');
    if (i > 0 && alpha <= (table.alphaDeg[i - 1] ?? NaN))
      throw new SolverInputError(`alphaDeg[${i}]`, alpha, `above the row before, ${table.alphaDeg[i - 1]}`);
    if (!Number.isFinite(table.cl[i])) throw new SolverInputError(`cl[${i}]`, table.cl[i], 'a finite number');
    if (!Number.isFinite(table.cd[i])) throw new SolverInputError(`cd[${i}]`, table.cd[i], 'a finite number');
  }
}

/**
 * A table made ready for look-ups. Periodic: between the last row and the first row a turn later the interpolation goes on.
 * Where −180° and 180° both stand, the two rows should agree (the row at −180° is used at the seam).
 * Throws SolverInputError on fewer than 2 rows, α not ascending or out of range, or values that are not finite.
 */
export function compilePolar(
  table: PolarTable,
  { interpolation = 'linear' }: { interpolation?: PolarInterpolation } = {},
): Polar {
  checkTable(table);
  const rows = Array.from({ length: table.alphaDeg.length }, (_, i) => [
    (table.alphaDeg[i] ?? 0) * RAD,
    table.cl[i] ?? 0,
    table.cd[i] ?? 0,
  ]);
  const first = rows[0] ?? [0, 0, 0];
  const last = rows.at(-1) ?? [0, 0, 0];
  // One row beyond each end closes the turn; a table from −180° to 180° has them already.
  const closed =
    (last[0] ?? 0) - (first[0] ?? 0) > TURN - 1e-12
      ? rows
      : [
          [(last[0] ?? 0) - TURN, last[1] ?? 0, last[2] ?? 0],
          ...rows,
          [(first[0] ?? 0) + TURN, first[1] ?? 0, first[2] ?? 0],
        ];
  const alpha = Float64Array.from(closed, (row) => row[0] ?? 0);
  const cl = Float64Array.from(closed, (row) => row[1] ?? 0);
  const cd = Float64Array.from(closed, (row) => row[2] ?? 0);
  const bucket = new Int32Array(BUCKETS + 1);
  let cell = 0;
  for (let k = 0; k <= BUCKETS; k += 1) {
    const at = -Math.PI + (k * TURN) / BUCKETS;
    while (cell < alpha.length - 2 && (alpha[cell + 1] ?? Infinity) <= at) cell += 1;
    bucket[k] = cell;
  }
  const cubic = interpolation === 'monotone-cubic';
  return {
    alpha,
    cl,
    cd,
    bucket,
    clSlope: cubic ? pchipSlopes(alpha, cl) : null,
    cdSlope: cubic ? pchipSlopes(alpha, cd) : null,
  };
}

/** Coefficients at an angle of attack (rad, any turn): cl into out[0], cd into out[1]. */
export function lookUp(polar: Polar, angle: number, out: Float64Array): void {
  let alpha = angle;
  if (alpha > Math.PI || alpha < -Math.PI) alpha -= TURN * Math.round(alpha / TURN);
  const xs = polar.alpha;
  let cell = polar.bucket[
    Math.max(0, Math.min(BUCKETS, Math.floor(((alpha + Math.PI) * BUCKETS) / TURN)))
  ] as number;
  const top = xs.length - 2;
  while (cell < top && (xs[cell + 1] as number) <= alpha) cell += 1;
  while (cell > 0 && (xs[cell] as number) > alpha) cell -= 1;
  const x0 = xs[cell] as number;
  const width = (xs[cell + 1] as number) - x0;
  const t = (alpha - x0) / width;
  const l0 = polar.cl[cell] as number;
  const l1 = polar.cl[cell + 1] as number;
  const d0 = polar.cd[cell] as number;
  const d1 = polar.cd[cell + 1] as number;
  if (polar.clSlope === null || polar.cdSlope === null) {
    out[0] = l0 + t * (l1 - l0);
    out[1] = d0 + t * (d1 - d0);
    return;
  }
  const u = 1 - t;
  const h00 = (1 + 2 * t) * u * u;
  const h10 = t * u * u * width;
  const h01 = t * t * (3 - 2 * t);
  const h11 = -t * t * u * width;
  out[0] =
    h00 * l0 + h10 * (polar.clSlope[cell] as number) + h01 * l1 + h11 * (polar.clSlope[cell + 1] as number);
  out[1] =
    h00 * d0 + h10 * (polar.cdSlope[cell] as number) + h01 * d1 + h11 * (polar.cdSlope[cell + 1] as number);
}
