import { SolverInputError } from '../input-error.ts';
import { pchipSlopes } from '../numerics/pchip.ts';
import type { PolarNodes } from './polar-nodes.ts';
import { polarNodes } from './polar-nodes.ts';

/** Coefficients against angle of attack in degrees; α ascends within [−180, 180]; columns of one length. */
export interface PolarTable {
  readonly alphaDeg: ArrayLike<number>;
  readonly cl: ArrayLike<number>;
  readonly cd: ArrayLike<number>;
  /** Pitching moment about the quarter chord; kept through blending, not used by the rotor. */
  readonly cm?: ArrayLike<number>;
}

export type PolarInterpolation = 'linear' | 'monotone-cubic';

/** Columns of a compiled polar: α in rad over one full turn and a bit; slopes (1/rad) where the interpolation is cubic. */
export interface PolarColumns {
  readonly alpha: Float64Array;
  readonly cl: Float64Array;
  readonly cd: Float64Array;
  readonly clSlope: Float64Array | null;
  readonly cdSlope: Float64Array | null;
}

/** A polar ready for the kernel; periodic. */
export interface Polar extends PolarColumns {
  /** Cell of each of `BUCKETS` even slices of the turn: the first candidate of a look-up. */
  readonly bucket: Int32Array;
  readonly nodes: PolarNodes;
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
  if (table.cm !== undefined && table.cm.length !== n)
    throw new SolverInputError('cm', `${table.cm.length} rows`, `${n} rows, as alphaDeg`);
  for (let i = 0; i < n; i += 1) {
    const alpha = table.alphaDeg[i] ?? NaN;
    if (!Number.isFinite(alpha) || alpha < -180 || alpha > 180)
      throw new SolverInputError(`alphaDeg[${i}]`, alpha, 'a number from −180 to 180');
    if (i > 0 && alpha <= (table.alphaDeg[i - 1] ?? NaN))
      throw new SolverInputError(`alphaDeg[${i}]`, alpha, `above the row before, ${table.alphaDeg[i - 1]}`);
    if (!Number.isFinite(table.cl[i])) throw new SolverInputError(`cl[${i}]`, table.cl[i], 'a finite number');
    if (!Number.isFinite(table.cd[i])) throw new SolverInputError(`cd[${i}]`, table.cd[i], 'a finite number');
    if (table.cm !== undefined && !Number.isFinite(table.cm[i]))
      throw new SolverInputError(`cm[${i}]`, table.cm[i], 'a finite number');
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
  const columns = {
    alpha,
    cl,
    cd,
    clSlope: cubic ? periodicSlopes(alpha, cl, closed === rows) : null,
    cdSlope: cubic ? periodicSlopes(alpha, cd, closed === rows) : null,
  };
  return { ...columns, bucket, nodes: polarNodes(columns, closed === rows ? 0 : 1) };
}

/** Slopes of the monotone cubic with the rows of the turns before and after at hand, so that it closes smoothly. */
function periodicSlopes(alpha: Float64Array, y: Float64Array, closed: boolean): Float64Array {
  const n = alpha.length;
  // A closed table's last row is its first; else the rows at both ends are those of the neighbouring turns.
  const back = closed ? n - 2 : n - 3;
  const ahead = closed ? 1 : 2;
  const x = [(alpha[back] ?? 0) - TURN, ...alpha, (alpha[ahead] ?? 0) + TURN];
  return pchipSlopes(x, [y[back] ?? 0, ...y, y[ahead] ?? 0]).slice(1, n + 1);
}

/** A look-up: the angle asked for, and what was found. Slopes per rad. */
export interface Coefficients {
  /** Angle of attack, any turn (rad). */
  angle: number;
  lift: number;
  drag: number;
  liftSlope: number;
  dragSlope: number;
  /** Angles between which the coefficients are one smooth piece, in the turn of the angle. */
  pieceFrom: number;
  pieceTo: number;
}

export function newCoefficients(): Coefficients {
  return { angle: NaN, lift: NaN, drag: NaN, liftSlope: NaN, dragSlope: NaN, pieceFrom: NaN, pieceTo: NaN };
}

/** Looks up the coefficients and their slopes at the angle in `at`. */
export function lookUp(polar: Polar, at: Coefficients): void {
  const { angle } = at;
  let turn = 0;
  if (angle > Math.PI || angle < -Math.PI) turn = TURN * Math.round(angle / TURN);
  const alpha = angle - turn;
  const xs = polar.alpha;
  let slice = ((alpha + Math.PI) * (BUCKETS / TURN)) | 0;
  if (slice < 0) slice = 0;
  else if (slice > BUCKETS) slice = BUCKETS;
  let cell = polar.bucket[slice] as number;
  const top = xs.length - 2;
  while (cell < top && (xs[cell + 1] as number) <= alpha) cell += 1;
  while (cell > 0 && (xs[cell] as number) > alpha) cell -= 1;
  const x0 = xs[cell] as number;
  const x1 = xs[cell + 1] as number;
  at.pieceFrom = x0 + turn;
  at.pieceTo = x1 + turn;
  const inverse = 1 / (x1 - x0);
  const lift = polar.cl[cell] as number;
  const drag = polar.cd[cell] as number;
  const liftChord = ((polar.cl[cell + 1] as number) - lift) * inverse;
  const dragChord = ((polar.cd[cell + 1] as number) - drag) * inverse;
  const way = alpha - x0;
  at.lift = lift + way * liftChord;
  at.drag = drag + way * dragChord;
  at.liftSlope = liftChord;
  at.dragSlope = dragChord;
  if (polar.clSlope !== null && polar.cdSlope !== null)
    bend(at, polar.clSlope, polar.cdSlope, cell, way * inverse);
}

/** Turns the chords of a cell into the cubics that have the slopes at its ends, at the share t of its width. */
function bend(at: Coefficients, clSlope: Float64Array, cdSlope: Float64Array, cell: number, t: number): void {
  const u = 1 - t;
  const reach = (at.pieceTo - at.pieceFrom) * t * u;
  const lift0 = (clSlope[cell] as number) - at.liftSlope;
  const lift1 = (clSlope[cell + 1] as number) - at.liftSlope;
  const drag0 = (cdSlope[cell] as number) - at.dragSlope;
  const drag1 = (cdSlope[cell + 1] as number) - at.dragSlope;
  at.lift += reach * (u * lift0 - t * lift1);
  at.drag += reach * (u * drag0 - t * drag1);
  at.liftSlope += u * (1 - 3 * t) * lift0 + t * (3 * t - 2) * lift1;
  at.dragSlope += u * (1 - 3 * t) * drag0 + t * (3 * t - 2) * drag1;
}

/** Lift and drag coefficient at an angle of attack (rad, any turn). */
export function coefficientsAt(polar: Polar, alphaRad: number): { cl: number; cd: number } {
  const at = newCoefficients();
  at.angle = alphaRad;
  lookUp(polar, at);
  return { cl: at.lift, cd: at.drag };
}
