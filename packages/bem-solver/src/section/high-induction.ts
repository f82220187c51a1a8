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
    const square = TANGENT_INDUCTION ** 2;
    // κ(1 − a)² = a_c² + m·a, smaller root, with the quotient turned and the discriminant multiplied out to keep their digits.
    const a = (kappa - square) / (kappa + m / 2 + Math.sqrt(kappa * (m + square) + (m * m) / 4));
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
  const p = (F * F) / 0.6427;
  const linear = (2 * 0.143 * F) / 0.6427;
  const constant = 0.889 - (0.0203 - 0.143 ** 2) / 0.6427;
  // A = k − p, B = −2k + linear, C = k − constant; B² − 4AC multiplied out, for its terms in k² cancel.
  const discriminant = 4 * k * (constant + p - linear) + linear * linear - 4 * p * constant;
  const A = k - p;
  const q = k - 0.5 * linear + 0.5 * Math.sqrt(Math.max(0, discriminant));
  const C = k - constant;
  const small = C / q;
  return small >= SWITCH_INDUCTION - 1e-9 && small <= 1 ? small : q / A;
}
