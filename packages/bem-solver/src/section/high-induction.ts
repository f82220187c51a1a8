import type { HighInduction } from './options.ts';

/** Axial induction from which Buhl's and Glauert's curves take over from momentum theory. */
export const SWITCH_INDUCTION = 0.4;
/** Tangent point of the straight line. */
export const TANGENT_INDUCTION = 1 / 3;

/** Thrust coefficient of an annulus at induction a in the high-induction region, for loss factor F. */
export function highInductionThrust(relation: HighInduction, a: number, F: number): number {
  if (relation === 'buhl') return 8 / 9 + (4 * F - 40 / 9) * a + (50 / 9 - 4 * F) * a * a; // Buhl 2005
  // Glauert's empirical curve as fitted for rotors: Eggleston and Stoddard 1987 (from memory).
  if (relation === 'glauert') return 0.889 - (0.0203 - (a * F - 0.143) ** 2) / 0.6427;
  // Straight line tangent to 4Fa(1 − a) at a_c: Wilson and Walker 1984 (from memory); derivable.
  return 4 * F * (TANGENT_INDUCTION ** 2 + (1 - 2 * TANGENT_INDUCTION) * a);
}

/** κ from which the high-induction relation is used: a/(1 − a) at the switch. */
export function switchKappa(relation: HighInduction): number {
  const a = relation === 'straight-tangent' ? TANGENT_INDUCTION : SWITCH_INDUCTION;
  return a / (1 - a);
}

/** Buhl's induction at a thrust coefficient; the textbook quotient turned so that it keeps its digits at F = 25/18. */
export function buhlInduction(ct: number, F: number): number {
  const q = 8 / 9 - ct;
  const b = 4 * F - 40 / 9;
  const d = 50 / 9 - 4 * F;
  const root = Math.sqrt(b * b - 4 * d * q);
  return b <= 0 ? (root - b) / (2 * d) : (-2 * q) / (b + root);
}

/** 1/(1 − a) beyond the switch, from κ = σ′cn/(4F sin²φ). */
export function inverseOneMinusA(relation: HighInduction, kappa: number, F: number): number {
  if (relation === 'buhl') return 5 / 3 - F + Math.sqrt(Math.max(0, 2 * F * kappa - F * (4 / 3 - F)));
  if (relation === 'straight-tangent') {
    const m = 1 - 2 * TANGENT_INDUCTION;
    const half = kappa + m / 2;
    // κ(1 − a)² = a_c² + m·a, smaller root, with the quotient turned to avoid cancellation.
    const a =
      (kappa - TANGENT_INDUCTION ** 2) /
      (half + Math.sqrt(half * half - kappa * (kappa - TANGENT_INDUCTION ** 2)));
    return 1 / (1 - a);
  }
  return 1 / (1 - glauertInduction(kappa, F));
}

/**
 * Glauert's curve does not meet momentum theory at a = 0.4 where F < 1: across the gap a is held at 0.4.
 * With k = 4Fκ the balance k(1 − a)² = CT(a) is a quadratic with one root in [0.4, 1].
 */
function glauertInduction(kappa: number, F: number): number {
  const k = 4 * F * kappa;
  if (k * (1 - SWITCH_INDUCTION) ** 2 <= highInductionThrust('glauert', SWITCH_INDUCTION, F))
    return SWITCH_INDUCTION;
  const A = k - (F * F) / 0.6427;
  const B = -2 * k + (2 * 0.143 * F) / 0.6427;
  const C = k - 0.889 + (0.0203 - 0.143 ** 2) / 0.6427;
  const q = -0.5 * (B - Math.sqrt(Math.max(0, B * B - 4 * A * C)));
  const small = C / q;
  return small >= SWITCH_INDUCTION - 1e-9 && small <= 1 ? small : q / A;
}
