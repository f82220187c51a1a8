const GOLDEN = 0.3819660112501051;
const MAX_STEPS = 100;

/**
 * Place of a local maximum of `f` in [a, b] by Brent's parabolic search, to `tolerance` in x.
 * Source: R. P. Brent, Algorithms for Minimization without Derivatives, Prentice-Hall 1973, ch. 5 (from memory).
 */
export function brentMaximum(
  f: (x: number) => number,
  a0: number,
  b0: number,
  tolerance: number,
): { x: number; value: number } {
  let a = a0;
  let b = b0;
  let x = a + GOLDEN * (b - a);
  let w = x;
  let v = x;
  let fx = -f(x);
  let fw = fx;
  let fv = fx;
  let step = 0;
  let before = 0;
  for (let i = 0; i < MAX_STEPS; i += 1) {
    const middle = 0.5 * (a + b);
    if (Math.abs(x - middle) <= 2 * tolerance - 0.5 * (b - a)) break;
    let p = 0;
    let q = 0;
    let r = 0;
    if (Math.abs(before) > tolerance) {
      r = (x - w) * (fx - fv);
      q = (x - v) * (fx - fw);
      p = (x - v) * q - (x - w) * r;
      q = 2 * (q - r);
      if (q > 0) p = -p;
      else q = -q;
      r = before;
      before = step;
    }
    if (q !== 0 && Math.abs(p) < Math.abs(0.5 * q * r) && p > q * (a - x) && p < q * (b - x)) {
      step = p / q;
      const u = x + step;
      if (u - a < 2 * tolerance || b - u < 2 * tolerance) step = x < middle ? tolerance : -tolerance;
    } else {
      before = (x < middle ? b : a) - x;
      step = GOLDEN * before;
    }
    const u = x + (Math.abs(step) >= tolerance ? step : step > 0 ? tolerance : -tolerance);
    const fu = -f(u);
    if (fu <= fx) {
      if (u < x) b = x;
      else a = x;
      [v, fv, w, fw, x, fx] = [w, fw, x, fx, u, fu];
    } else {
      if (u < x) a = u;
      else b = u;
      if (fu <= fw || w === x) [v, fv, w, fw] = [w, fw, u, fu];
      else if (fu <= fv || v === x || v === w) [v, fv] = [u, fu];
    }
  }
  return { x, value: -fx };
}
