/** How a bracketed search ended. */
export type RootStatus = 'converged' | 'no-sign-change' | 'too-many-steps';

export interface RootResult {
  readonly status: RootStatus;
  readonly x: number;
  readonly residual: number;
  readonly evaluations: number;
}

/** Far more than a simple root needs; a root of high order takes over a hundred. */
const MAX_STEPS = 400;

/**
 * Root of `f` in [a, b] with f(a)·f(b) ≤ 0 by Brent's method.
 * Stops when the bracket is narrower than 2·(2ε|x| + tolerance/2) or the residual is exactly 0.
 * Source: R. P. Brent, Algorithms for Minimization without Derivatives, Prentice-Hall 1973, ch. 4 (from memory).
 */
export function brent(f: (x: number) => number, a0: number, b0: number, tolerance = 1e-14): RootResult {
  let a = a0;
  let b = b0;
  let fa = f(a);
  let fb = f(b);
  if (fa * fb > 0) return { status: 'no-sign-change', x: NaN, residual: NaN, evaluations: 2 };
  let c = a;
  let fc = fa;
  let step = b - a;
  let before = step;
  for (let count = 2; count < MAX_STEPS; count += 1) {
    if (fb * fc > 0) {
      c = a;
      fc = fa;
      step = b - a;
      before = step;
    }
    if (Math.abs(fc) < Math.abs(fb)) {
      a = b;
      b = c;
      c = a;
      fa = fb;
      fb = fc;
      fc = fa;
    }
    const slack = 2 * Number.EPSILON * Math.abs(b) + 0.5 * tolerance;
    const half = 0.5 * (c - b);
    if (Math.abs(half) <= slack || fb === 0)
      return { status: 'converged', x: b, residual: fb, evaluations: count };
    let next = half;
    if (Math.abs(before) >= slack && Math.abs(fa) > Math.abs(fb)) {
      const s = fb / fa;
      let p: number;
      let q: number;
      if (a === c) {
        p = 2 * half * s;
        q = 1 - s;
      } else {
        const u = fa / fc;
        const v = fb / fc;
        p = s * (2 * half * u * (u - v) - (b - a) * (v - 1));
        q = (u - 1) * (v - 1) * (s - 1);
      }
      if (p > 0) q = -q;
      p = Math.abs(p);
      if (2 * p < Math.min(3 * half * q - Math.abs(slack * q), Math.abs(before * q))) {
        before = step;
        next = p / q;
      } else before = half;
    } else before = half;
    step = next;
    a = b;
    fa = fb;
    b += Math.abs(step) > slack ? step : half > 0 ? slack : -slack;
    fb = f(b);
  }
  return { status: 'too-many-steps', x: b, residual: fb, evaluations: MAX_STEPS };
}
