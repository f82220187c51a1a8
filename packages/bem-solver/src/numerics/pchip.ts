/**
 * Slopes of the monotone piecewise cubic through (x, y).
 * Source: F. N. Fritsch and J. Butland, SIAM J. Sci. Stat. Comput. 5 (1984) 300–304 (from memory): weighted harmonic mean inside,
 * one-sided three-point formula limited to keep monotone at the ends.
 */
export function pchipSlopes(x: ArrayLike<number>, y: ArrayLike<number>): Float64Array {
  const n = x.length;
  const slopes = new Float64Array(n);
  if (n < 2) return slopes;
  const width = (i: number) => (x[i + 1] ?? 0) - (x[i] ?? 0);
  const rise = (i: number) => ((y[i + 1] ?? 0) - (y[i] ?? 0)) / width(i);
  if (n === 2) return slopes.fill(rise(0));
  for (let i = 1; i < n - 1; i += 1) {
    const left = rise(i - 1);
    const right = rise(i);
    if (left * right <= 0) continue;
    const w1 = 2 * width(i) + width(i - 1);
    const w2 = width(i) + 2 * width(i - 1);
    slopes[i] = (w1 + w2) / (w1 / left + w2 / right);
  }
  slopes[0] = endSlope(width(0), width(1), rise(0), rise(1));
  slopes[n - 1] = endSlope(width(n - 2), width(n - 3), rise(n - 2), rise(n - 3));
  return slopes;
}

function endSlope(near: number, far: number, riseNear: number, riseFar: number): number {
  const slope = ((2 * near + far) * riseNear - near * riseFar) / (near + far);
  if (slope * riseNear <= 0) return 0;
  if (riseNear * riseFar <= 0 && Math.abs(slope) > 3 * Math.abs(riseNear)) return 3 * riseNear;
  return slope;
}

/** Value of the cubic at `at`, within [x0, xn]; held constant outside. */
export function pchipAt(
  x: ArrayLike<number>,
  y: ArrayLike<number>,
  slopes: ArrayLike<number>,
  at: number,
): number {
  const n = x.length;
  if (at <= (x[0] ?? 0)) return y[0] ?? 0;
  if (at >= (x[n - 1] ?? 0)) return y[n - 1] ?? 0;
  let cell = 0;
  while (cell < n - 2 && (x[cell + 1] ?? 0) <= at) cell += 1;
  const x0 = x[cell] ?? 0;
  const width = (x[cell + 1] ?? 0) - x0;
  const t = (at - x0) / width;
  const u = 1 - t;
  return (
    (1 + 2 * t) * u * u * (y[cell] ?? 0) +
    t * u * u * width * (slopes[cell] ?? 0) +
    t * t * (3 - 2 * t) * (y[cell + 1] ?? 0) -
    t * t * u * width * (slopes[cell + 1] ?? 0)
  );
}
