/** Coefficients of the Taylor polynomials: ±1/n! */
const S1 = -1 / 6;
const S2 = 1 / 120;
const S3 = -1 / 5040;
const S4 = 1 / 362880;
const S5 = -1 / 39916800;
const S6 = 1 / 6227020800;
const S7 = -1 / 1307674368000;
const S8 = 1 / 355687428096000;
const S9 = -1 / 121645100408832000;
const S10 = 1 / 51090942171709440000;
const C1 = -1 / 2;
const C2 = 1 / 24;
const C3 = -1 / 720;
const C4 = 1 / 40320;
const C5 = -1 / 3628800;
const C6 = 1 / 479001600;
const C7 = -1 / 87178291200;
const C8 = 1 / 20922789888000;
const C9 = -1 / 6402373705728000;
const C10 = 1 / 2432902008176640000;

export interface AngleFunctions {
  /** rad, |φ| ≤ π. */
  phi: number;
  sine: number;
  cosine: number;
}

/**
 * Sine and cosine of φ within 2e-15: Taylor polynomials of φ/2 and the double-angle formulas; a third of the cost of two
 * library calls.
 */
export function sineCosine(at: AngleFunctions): void {
  const y = 0.5 * at.phi;
  const z = y * y;
  const s =
    y *
    (1 +
      z *
        (S1 +
          z * (S2 + z * (S3 + z * (S4 + z * (S5 + z * (S6 + z * (S7 + z * (S8 + z * (S9 + z * S10))))))))));
  const c =
    1 +
    z *
      (C1 + z * (C2 + z * (C3 + z * (C4 + z * (C5 + z * (C6 + z * (C7 + z * (C8 + z * (C9 + z * C10)))))))));
  at.sine = 2 * s * c;
  at.cosine = 1 - 2 * s * s;
}
