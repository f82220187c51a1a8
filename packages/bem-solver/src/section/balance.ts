import type { Coefficients, Polar } from '../airfoil/polar.ts';
import { lookUp, newCoefficients } from '../airfoil/polar.ts';
import { sineCosine } from '../numerics/sine-cosine.ts';
import { inverseOneMinusA, switchKappa } from './high-induction.ts';
import { factorAtRoot, factorSlopeAtRoot } from './loss.ts';
import type { LossShape } from './loss.ts';
import type { HighInduction, SolverOptions } from './options.ts';

/**
 * The balance λr·D(φ) = N(φ) of one blade element. What is given and what is found live in fields of one object, for in the
 * innermost loop a number passed to or from a function may cost an allocation. Angles in rad, slopes per rad of φ.
 */
export interface Balance {
  polar: Polar;
  relation: HighInduction;
  readonly section: Coefficients;
  sigma: number;
  /** Twist plus pitch. */
  pitch: number;
  /** Square roots of the loss shape: √f = root/√|sin φ|. */
  tipRoot: number;
  hubRoot: number;
  /** 1 where drag takes part in the inductions, else 0. */
  dragShare: number;
  /** κ from which the high-induction relation holds, times 4. */
  switchKappa4: number;
  /** Inflow angle to evaluate at, its sine and cosine. */
  phi: number;
  sine: number;
  cosine: number;
  numerator: number;
  denominator: number;
  numeratorSlope: number;
  denominatorSlope: number;
  /** How far D moves with cn. */
  denominatorPerCn: number;
  factor: number;
  factorSlope: number;
  /** Coefficients of the loads, drag included whatever the options. */
  cn: number;
  ct: number;
  cnSlope: number;
  ctSlope: number;
  /** φ between which the balance is one smooth piece of the polar. */
  phiFrom: number;
  phiTo: number;
  /** Local speed ratio to solve for; the root found and Newton's last step to it from where the balance was evaluated. */
  lambda: number;
  root: number;
  step: number;
}

export function newBalance(polar: Polar): Balance {
  // NaN, not 0: the fields are to hold floating-point numbers from the start.
  return {
    polar,
    relation: 'buhl',
    section: newCoefficients(),
    sigma: NaN,
    pitch: NaN,
    tipRoot: NaN,
    hubRoot: NaN,
    dragShare: NaN,
    switchKappa4: NaN,
    phi: NaN,
    sine: NaN,
    cosine: NaN,
    numerator: NaN,
    denominator: NaN,
    numeratorSlope: NaN,
    denominatorSlope: NaN,
    denominatorPerCn: NaN,
    factor: NaN,
    factorSlope: NaN,
    cn: NaN,
    ct: NaN,
    cnSlope: NaN,
    ctSlope: NaN,
    phiFrom: NaN,
    phiTo: NaN,
    lambda: NaN,
    root: NaN,
    step: NaN,
  };
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
  balance.relation = options.highInduction;
  balance.sigma = solidity;
  balance.pitch = pitchRad;
  balance.tipRoot = Math.sqrt(loss.tip);
  balance.hubRoot = Math.sqrt(loss.hub);
  balance.dragShare = options.dragInInduction ? 1 : 0;
  balance.switchKappa4 = 4 * switchKappa(options.highInduction);
}

/** Evaluates the balance at its φ. */
export function evaluateBalance(balance: Balance): void {
  const pitch = balance.pitch;
  balance.section.angle = balance.phi - pitch;
  lookUp(balance.polar, balance.section);
  balance.phiFrom = balance.section.pieceFrom + pitch;
  balance.phiTo = balance.section.pieceTo + pitch;
  sineCosine(balance);
  balanceForces(balance);
}

/** Prandtl's factor and its slope in φ, from sine and cosine. */
function takeLoss(balance: Balance): void {
  const s = balance.sine;
  const inverse = 1 / Math.sqrt(Math.abs(s));
  const tipRoot = balance.tipRoot * inverse;
  const hubRoot = balance.hubRoot * inverse;
  const tip = factorAtRoot(tipRoot);
  const hub = factorAtRoot(hubRoot);
  let slope = 0;
  // du/dφ = −u·c/(2s) for u = √f; a factor of 1 has no slope, and its u may be infinite.
  if (tip < 1) slope += hub * tipRoot * factorSlopeAtRoot(tipRoot);
  if (hub < 1) slope += tip * hubRoot * factorSlopeAtRoot(hubRoot);
  balance.factor = tip * hub;
  balance.factorSlope = (-0.5 * slope * balance.cosine) / s;
}

/**
 * The balance of momentum and blade-element forces as λr·D(φ) = N(φ): a rearrangement of Ning's residual (2014) without
 * poles that is linear in the local speed ratio. N = 4F|s|c − σ′ct; D = 4F|s|s + σ′cn by momentum theory, D = 4Fs·h in high
 * induction, where h = sinφ/(1 − a). Everywhere D = 4F|s|h. A root is admissible, the air passing the way φ says, where
 * D > 0. Takes sine, cosine, lift, drag and their slopes as they stand in it.
 */
export function balanceForces(balance: Balance): void {
  takeLoss(balance);
  const F = balance.factor;
  const dF = balance.factorSlope;
  const s = balance.sine;
  const c = balance.cosine;
  const cl = balance.section.lift;
  const cd = balance.section.drag;
  const clSlope = balance.section.liftSlope;
  const cdSlope = balance.section.dragSlope;
  const sigma = balance.sigma;
  let cn = cl * c + cd * s;
  let ct = cl * s - cd * c;
  let dcn = clSlope * c + cdSlope * s - ct;
  let dct = clSlope * s - cdSlope * c + cn;
  balance.cn = cn;
  balance.ct = ct;
  balance.cnSlope = dcn;
  balance.ctSlope = dct;
  if (balance.dragShare === 0) {
    cn = cl * c;
    ct = cl * s;
    dcn = clSlope * c - ct;
    dct = clSlope * s + cn;
  }
  const fourFs = 4 * F * Math.abs(s);
  const slope = 4 * (dF * Math.abs(s) + (s < 0 ? -F : F) * c);
  balance.numerator = fourFs * c - sigma * ct;
  balance.numeratorSlope = slope * c - fourFs * s - sigma * dct;
  if (s > 0 && sigma * cn > balance.switchKappa4 * F * s * s) {
    if (balance.relation === 'buhl') buhl(balance, sigma * cn, sigma * dcn);
    else otherRelation(balance, cn, dcn);
    return;
  }
  balance.denominator = fourFs * s + sigma * cn;
  balance.denominatorSlope = slope * s + fourFs * c + sigma * dcn;
  balance.denominatorPerCn = sigma;
}

/** D from h = sinφ/(1 − a), its slope and its slope in cn. */
function takeDenominator(balance: Balance, h: number, dh: number, hPerCn: number): void {
  const F = balance.factor;
  const s = balance.sine;
  const c = balance.cosine;
  balance.denominator = 4 * F * s * h;
  balance.denominatorSlope = 4 * (balance.factorSlope * s * h + F * (c * h + s * dh));
  balance.denominatorPerCn = 4 * F * s * hPerCn;
}

/** 1/(1 − a) = 5/3 − F + √(2Fκ − F(4/3 − F)): Buhl's relation (2005) solved; times sin φ it has no pole at φ = 0. */
function buhl(balance: Balance, load: number, dLoad: number): void {
  const F = balance.factor;
  const dF = balance.factorSlope;
  const s = balance.sine;
  const c = balance.cosine;
  const root = Math.sqrt(0.5 * load - F * (4 / 3 - F) * s * s);
  const half = 0.5 / root;
  const bend = dF * (4 / 3 - 2 * F) * s * s + F * (4 / 3 - F) * 2 * s * c;
  const dh = c * (5 / 3 - F) - s * dF + half * (0.5 * dLoad - bend);
  takeDenominator(balance, s * (5 / 3 - F) + root, dh, half * 0.5 * balance.sigma);
}

const RELATIVE_STEP = 1e-6;

/** The other relations, with slopes by differences: they only steer Newton's method. */
function otherRelation(balance: Balance, cn: number, dcn: number): void {
  const { relation } = balance;
  const F = balance.factor;
  const dF = balance.factorSlope;
  const s = balance.sine;
  const c = balance.cosine;
  const kappa = (balance.sigma * cn) / (4 * F * s * s);
  const inverse = inverseOneMinusA(relation, kappa, F);
  const more = 1 + RELATIVE_STEP;
  const perKappa = (inverseOneMinusA(relation, kappa * more, F) - inverse) / (kappa * RELATIVE_STEP);
  const perF = (inverseOneMinusA(relation, kappa, F * more) - inverse) / (F * RELATIVE_STEP);
  const dKappa = kappa * (dcn / cn - dF / F - (2 * c) / s);
  const dh = c * inverse + s * (perKappa * dKappa + perF * dF);
  takeDenominator(balance, s * inverse, dh, (s * perKappa * kappa) / cn);
}
