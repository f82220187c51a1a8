import type { Polar } from '../airfoil/polar.ts';
import { DRAG, DRAG_SLOPE, LIFT, LIFT_SLOPE, lookUp, PIECE_FROM, PIECE_TO } from '../airfoil/polar.ts';
import { inverseOneMinusA, switchKappa } from './high-induction.ts';
import { factorAtRoot, factorSlopeAtRoot } from './loss.ts';
import type { LossShape } from './loss.ts';
import type { HighInduction, SolverOptions } from './options.ts';

/** A blade element with what the balance takes from it and from the options at hand as plain numbers. */
export interface Balance {
  polar: Polar;
  sigma: number;
  pitch: number;
  /** Square roots of the loss shape: √f = root/√|sin φ|. */
  tipRoot: number;
  hubRoot: number;
  /** 1 where drag takes part in the inductions, else 0. */
  dragShare: number;
  relation: HighInduction;
  /** κ from which the high-induction relation holds, times 4. */
  switchKappa4: number;
}

/** Places in the record of an evaluated balance. Slopes are per rad of φ. */
export const NUMERATOR = 0;
export const DENOMINATOR = 1;
export const NUMERATOR_SLOPE = 2;
export const DENOMINATOR_SLOPE = 3;
/** How far the denominator moves with cn. */
export const DENOMINATOR_PER_CN = 4;
export const FACTOR = 5;
export const FACTOR_SLOPE = 6;
/** Coefficients of the loads, drag included whatever the options. */
export const CN = 7;
export const CT = 8;
export const CN_SLOPE = 9;
export const CT_SLOPE = 10;
export const CL = 11;
export const CD = 12;
/** φ between which the balance is one smooth piece of the polar. */
export const PHI_FROM = 13;
export const PHI_TO = 14;
export const SINE = 15;
export const COSINE = 16;
const PLACES = 17;

export function balanceRecord(): Float64Array {
  return new Float64Array(PLACES);
}

export function setBalance(
  balance: Balance,
  polar: Polar,
  solidity: number,
  pitchRad: number,
  loss: LossShape,
  options: SolverOptions,
): void {
  balance.polar = polar;
  balance.sigma = solidity;
  balance.pitch = pitchRad;
  balance.tipRoot = Math.sqrt(loss.tip);
  balance.hubRoot = Math.sqrt(loss.hub);
  balance.dragShare = options.dragInInduction ? 1 : 0;
  balance.relation = options.highInduction;
  balance.switchKappa4 = 4 * switchKappa(options.highInduction);
}

const coefficients = new Float64Array(6);

/** Evaluates the balance at an inflow angle. */
export function evaluateBalance(balance: Balance, phi: number, out: Float64Array): void {
  lookUp(balance.polar, phi - balance.pitch, coefficients);
  out[PHI_FROM] = (coefficients[PIECE_FROM] as number) + balance.pitch;
  out[PHI_TO] = (coefficients[PIECE_TO] as number) + balance.pitch;
  balanceFrom(
    balance,
    Math.sin(phi),
    Math.cos(phi),
    coefficients[LIFT] as number,
    coefficients[DRAG] as number,
    coefficients[LIFT_SLOPE] as number,
    coefficients[DRAG_SLOPE] as number,
    out,
  );
}

/**
 * The balance of momentum and blade-element forces as λr·D(φ) = N(φ): a rearrangement of Ning's residual (2014) without
 * poles that is linear in the local speed ratio. N = 4F|s|c − σ′ct; D = 4F|s|s + σ′cn by momentum theory (with |s|s = −s²
 * below the rotor plane), D = 4Fs·h in high induction, where h = sinφ/(1 − a). Everywhere D = 4F|s|h. A root is admissible,
 * the air passing the way φ says, where D > 0.
 */
export function balanceFrom(
  balance: Balance,
  s: number,
  c: number,
  cl: number,
  cd: number,
  clSlope: number,
  cdSlope: number,
  out: Float64Array,
): void {
  const { sigma, dragShare } = balance;
  const side = s < 0 ? -1 : 1;
  const mag = side * s;
  const rootInverse = 1 / Math.sqrt(mag);
  const tip = factorAtRoot(balance.tipRoot * rootInverse);
  const hub = factorAtRoot(balance.hubRoot * rootInverse);
  const F = tip * hub;
  let dF = 0;
  if (F < 1) {
    const tipU = balance.tipRoot * rootInverse;
    const hubU = balance.hubRoot * rootInverse;
    // du/dφ = −u·c/(2s)
    dF = (-0.5 * c * (hub * slopeTimes(tipU) + tip * slopeTimes(hubU))) / s;
  }
  out[FACTOR] = F;
  out[FACTOR_SLOPE] = dF;
  const cn = cl * c + cd * s;
  const ct = cl * s - cd * c;
  const dcn = clSlope * c + cdSlope * s - ct;
  const dct = clSlope * s - cdSlope * c + cn;
  out[CL] = cl;
  out[CD] = cd;
  out[CN] = cn;
  out[CT] = ct;
  out[CN_SLOPE] = dcn;
  out[CT_SLOPE] = dct;
  out[SINE] = s;
  out[COSINE] = c;
  const without = dragShare - 1;
  const cnI = cn + without * cd * s;
  const ctI = ct - without * cd * c;
  const dcnI = dcn + without * (cdSlope * s + cd * c);
  const dctI = dct - without * (cdSlope * c - cd * s);
  out[NUMERATOR] = 4 * F * mag * c - sigma * ctI;
  out[NUMERATOR_SLOPE] = 4 * (dF * mag * c + F * side * (c * c - s * s)) - sigma * dctI;
  if (s > 0 && sigma * cnI > balance.switchKappa4 * F * s * s) {
    highInduction(balance, F, dF, s, c, cnI, dcnI, out);
    return;
  }
  out[DENOMINATOR] = 4 * F * mag * s + sigma * cnI;
  out[DENOMINATOR_SLOPE] = 4 * (dF * mag * s + 2 * F * mag * c) + sigma * dcnI;
  out[DENOMINATOR_PER_CN] = sigma;
}

function slopeTimes(u: number): number {
  return u < 1e9 ? u * factorSlopeAtRoot(u) : 0;
}

function highInduction(
  balance: Balance,
  F: number,
  dF: number,
  s: number,
  c: number,
  cn: number,
  dcn: number,
  out: Float64Array,
): void {
  const { sigma } = balance;
  let h: number;
  let dh: number;
  let hPerCn: number;
  if (balance.relation === 'buhl') {
    // 1/(1 − a) = 5/3 − F + √(2Fκ − F(4/3 − F)): Buhl's relation (2005) solved, times sin φ; no pole at s = 0.
    const q = 0.5 * sigma * cn - F * (4 / 3 - F) * s * s;
    const root = Math.sqrt(q);
    h = s * (5 / 3 - F) + root;
    hPerCn = (0.25 * sigma) / root;
    dh =
      c * (5 / 3 - F) -
      s * dF +
      hPerCn * dcn -
      (dF * (4 / 3 - 2 * F) * s * s + F * (4 / 3 - F) * 2 * s * c) / (2 * root);
  } else {
    const kappa = (sigma * cn) / (4 * F * s * s);
    const inverse = inverseOneMinusA(balance.relation, kappa, F);
    const step = 1e-6;
    const perKappa = (inverseOneMinusA(balance.relation, kappa * (1 + step), F) - inverse) / (kappa * step);
    const perF = (inverseOneMinusA(balance.relation, kappa, F * (1 + step)) - inverse) / (F * step);
    const dKappa = kappa * (dcn / cn - dF / F - (2 * c) / s);
    h = s * inverse;
    hPerCn = (s * perKappa * kappa) / cn;
    dh = c * inverse + s * (perKappa * dKappa + perF * dF);
  }
  out[DENOMINATOR] = 4 * F * s * h;
  out[DENOMINATOR_SLOPE] = 4 * (dF * s * h + F * c * h + F * s * dh);
  out[DENOMINATOR_PER_CN] = 4 * F * s * hPerCn;
}
