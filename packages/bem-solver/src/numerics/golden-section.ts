const RATIO = (Math.sqrt(5) - 1) / 2;

/** Place of the largest value of a unimodal `f` on [a, b], to `tolerance` in x, by golden section. */
export function goldenMaximum(
  f: (x: number) => number,
  a0: number,
  b0: number,
  tolerance: number,
): { x: number; value: number } {
  let a = a0;
  let b = b0;
  let x1 = b - RATIO * (b - a);
  let x2 = a + RATIO * (b - a);
  let f1 = f(x1);
  let f2 = f(x2);
  while (b - a > tolerance) {
    if (f1 >= f2) {
      b = x2;
      x2 = x1;
      f2 = f1;
      x1 = b - RATIO * (b - a);
      f1 = f(x1);
    } else {
      a = x1;
      x1 = x2;
      f1 = f2;
      x2 = a + RATIO * (b - a);
      f2 = f(x2);
    }
  }
  return f1 >= f2 ? { x: x1, value: f1 } : { x: x2, value: f2 };
}
