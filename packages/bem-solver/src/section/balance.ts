import type { Polar } from '../airfoil/polar.ts';
import {
  ANGLE,
  DRAG,
  DRAG_SLOPE,
  LIFT,
  LIFT_SLOPE,
  LOOK_UP_PLACES,
  lookUp,
  PIECE_FROM,
  PIECE_TO,
} from '../airfoil/polar.ts';
import { sineCosine } from '../numerics/sine-cosine.ts';
import { inverseOneMinusA, switchKappa } from './high-induction.ts';
import { factorAtRoot, factorSlopeAtRoot } from './loss.ts';
import type { LossShape } from './loss.ts';
import type { HighInduction, SolverOptions } from './options.ts';

/**
 * The balance of one blade element. All numbers, given and found, live in one record, at the places below, for in the
 * innermost loop a number passed to or from a function may cost an allocation.
 */
export interface Balance {
  polar: Polar;
  relation: HighInduction;
  readonly record: Float64Array;
}

/** Inflow angle to evaluate at, its sine and cosine. */
export const PHI = LOOK_UP_PLACES;
export const SINE = PHI + 1;
export const COSINE = PHI + 2;
/** λr·D(φ) = N(φ); slopes are per rad of φ. */
export const NUMERATOR = PHI + 3;
export const DENOMINATOR = PHI + 4;
export const NUMERATOR_SLOPE = PHI + 5;
export const DENOMINATOR_SLOPE = PHI + 6;
/** How far D moves with cn. */
export const DENOMINATOR_PER_CN = PHI + 7;
export const FACTOR = PHI + 8;
export const FACTOR_SLOPE = PHI + 9;
/** Coefficients of the loads, drag included whatever the options. */
export const CN = PHI + 10;
export const CT = PHI + 11;
export const CN_SLOPE = PHI + 12;
export const CT_SLOPE = PHI + 13;
/** φ between which the balance is one smooth piece of the polar. */
export const PHI_FROM = PHI + 14;
export const PHI_TO = PHI + 15;
export const SIGMA = PHI + 16;
/** Twist plus pitch (rad). */
export const PITCH = PHI + 17;
/** Square roots of the loss shape: √f = root/√|sin φ|. */
export const TIP_ROOT = PHI + 18;
export const HUB_ROOT = PHI + 19;
/** 1 where drag takes part in the inductions, else 0. */
export const DRAG_SHARE = PHI + 20;
/** κ from which the high-induction relation holds, times 4. */
export const SWITCH_KAPPA_4 = PHI + 21;
/** Local speed ratio to solve for; the root found and Newton's last step to it from where the record was evaluated. */
export const LAMBDA = PHI + 22;
export const ROOT = PHI + 23;
export const STEP = PHI + 24;
const PLACES = PHI + 25;

export function newBalance(polar: Polar): Balance {
  return { polar, relation: 'buhl', record: new Float64Array(PLACES) };
}

export function setBalance(
  balance: Balance,
  polar: Polar,
  solidity: number,
  pitchRad: number,
  loss: LossShape,
  options: SolverOptions,
): void {
  const { record } = balance;
  balance.polar = polar;
  balance.relation = options.highInduction;
  record[SIGMA] = solidity;
  record[PITCH] = pitchRad;
  record[TIP_ROOT] = Math.sqrt(loss.tip);
  record[HUB_ROOT] = Math.sqrt(loss.hub);
  record[DRAG_SHARE] = options.dragInInduction ? 1 : 0;
  record[SWITCH_KAPPA_4] = 4 * switchKappa(options.highInduction);
}

/** Evaluates the balance at record[PHI]. */
export function evaluateBalance(balance: Balance): void {
  const { record } = balance;
  const pitch = record[PITCH] as number;
  record[ANGLE] = (record[PHI] as number) - pitch;
  lookUp(balance.polar, record);
  record[PHI_FROM] = (record[PIECE_FROM] as number) + pitch;
  record[PHI_TO] = (record[PIECE_TO] as number) + pitch;
  sineCosine(record, PHI, SINE);
  balanceForces(balance);
}

/** Prandtl's factor and its slope in φ, from sine and cosine. */
function takeLoss(record: Float64Array): void {
  const s = record[SINE] as number;
  const inverse = 1 / Math.sqrt(Math.abs(s));
  const tipRoot = (record[TIP_ROOT] as number) * inverse;
  const hubRoot = (record[HUB_ROOT] as number) * inverse;
  const tip = factorAtRoot(tipRoot);
  const hub = factorAtRoot(hubRoot);
  let slope = 0;
  // du/dφ = −u·c/(2s) for u = √f; a factor of 1 has no slope, and its u may be infinite.
  if (tip < 1) slope += hub * tipRoot * factorSlopeAtRoot(tipRoot);
  if (hub < 1) slope += tip * hubRoot * factorSlopeAtRoot(hubRoot);
  record[FACTOR] = tip * hub;
  record[FACTOR_SLOPE] = (-0.5 * slope * (record[COSINE] as number)) / s;
}

/**
 * The balance of momentum and blade-element forces as λr·D(φ) = N(φ): a rearrangement of Ning's residual (2014) without
 * poles that is linear in the local speed ratio. N = 4F|s|c − σ′ct; D = 4F|s|s + σ′cn by momentum theory, D = 4Fs·h in high
 * induction, where h = sinφ/(1 − a). Everywhere D = 4F|s|h. A root is admissible, the air passing the way φ says, where
 * D > 0. Takes sine, cosine, lift, drag and their slopes from the record.
 */
export function balanceForces(balance: Balance): void {
  const { record } = balance;
  takeLoss(record);
  const F = record[FACTOR] as number;
  const dF = record[FACTOR_SLOPE] as number;
  const s = record[SINE] as number;
  const c = record[COSINE] as number;
  const cl = record[LIFT] as number;
  const cd = record[DRAG] as number;
  const clSlope = record[LIFT_SLOPE] as number;
  const cdSlope = record[DRAG_SLOPE] as number;
  const sigma = record[SIGMA] as number;
  let cn = cl * c + cd * s;
  let ct = cl * s - cd * c;
  let dcn = clSlope * c + cdSlope * s - ct;
  let dct = clSlope * s - cdSlope * c + cn;
  record[CN] = cn;
  record[CT] = ct;
  record[CN_SLOPE] = dcn;
  record[CT_SLOPE] = dct;
  if (record[DRAG_SHARE] === 0) {
    cn = cl * c;
    ct = cl * s;
    dcn = clSlope * c - ct;
    dct = clSlope * s + cn;
  }
  const fourFs = 4 * F * Math.abs(s);
  const slope = 4 * (dF * Math.abs(s) + (s < 0 ? -F : F) * c);
  record[NUMERATOR] = fourFs * c - sigma * ct;
  record[NUMERATOR_SLOPE] = slope * c - fourFs * s - sigma * dct;
  if (s > 0 && sigma * cn > (record[SWITCH_KAPPA_4] as number) * F * s * s) {
    if (balance.relation === 'buhl') buhl(record, sigma * cn, sigma * dcn);
    else otherRelation(balance, cn, dcn);
    return;
  }
  record[DENOMINATOR] = fourFs * s + sigma * cn;
  record[DENOMINATOR_SLOPE] = slope * s + fourFs * c + sigma * dcn;
  record[DENOMINATOR_PER_CN] = sigma;
}

/** D from h = sinφ/(1 − a), its slope and its slope in cn. */
function takeDenominator(record: Float64Array, h: number, dh: number, hPerCn: number): void {
  const F = record[FACTOR] as number;
  const s = record[SINE] as number;
  const c = record[COSINE] as number;
  record[DENOMINATOR] = 4 * F * s * h;
  record[DENOMINATOR_SLOPE] = 4 * ((record[FACTOR_SLOPE] as number) * s * h + F * (c * h + s * dh));
  record[DENOMINATOR_PER_CN] = 4 * F * s * hPerCn;
}

/** 1/(1 − a) = 5/3 − F + √(2Fκ − F(4/3 − F)): Buhl's relation (2005) solved; times sin φ it has no pole at φ = 0. */
function buhl(record: Float64Array, load: number, dLoad: number): void {
  const F = record[FACTOR] as number;
  const dF = record[FACTOR_SLOPE] as number;
  const s = record[SINE] as number;
  const c = record[COSINE] as number;
  const root = Math.sqrt(0.5 * load - F * (4 / 3 - F) * s * s);
  const half = 0.5 / root;
  const bend = dF * (4 / 3 - 2 * F) * s * s + F * (4 / 3 - F) * 2 * s * c;
  const dh = c * (5 / 3 - F) - s * dF + half * (0.5 * dLoad - bend);
  takeDenominator(record, s * (5 / 3 - F) + root, dh, half * 0.5 * (record[SIGMA] as number));
}

const RELATIVE_STEP = 1e-6;

/** The other relations, with slopes by differences: they only steer Newton's method. */
function otherRelation(balance: Balance, cn: number, dcn: number): void {
  const { record, relation } = balance;
  const F = record[FACTOR] as number;
  const dF = record[FACTOR_SLOPE] as number;
  const s = record[SINE] as number;
  const c = record[COSINE] as number;
  const kappa = ((record[SIGMA] as number) * cn) / (4 * F * s * s);
  const inverse = inverseOneMinusA(relation, kappa, F);
  const more = 1 + RELATIVE_STEP;
  const perKappa = (inverseOneMinusA(relation, kappa * more, F) - inverse) / (kappa * RELATIVE_STEP);
  const perF = (inverseOneMinusA(relation, kappa, F * more) - inverse) / (F * RELATIVE_STEP);
  const dKappa = kappa * (dcn / cn - dF / F - (2 * c) / s);
  const dh = c * inverse + s * (perKappa * dKappa + perF * dF);
  takeDenominator(record, s * inverse, dh, (s * perKappa * kappa) / cn);
}
