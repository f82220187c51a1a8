import type { PolarNodes } from '../airfoil/polar-nodes.ts';
import { balanceForces, evaluateBalance } from './balance.ts';
import type { Balance } from './balance.ts';

/**
 * A section's balance λr·D = N tabulated over a range of inflow angles. As it is linear in λr, the table is the section's
 * whole solution for every local speed ratio, λr(φ) = N/D where D > 0, and tells how many roots there are.
 */
export interface Branch {
  ready: boolean;
  count: number;
  phi: Float64Array;
  numerator: Float64Array;
  denominator: Float64Array;
  /** λr of the node, and dλr/dφ to its left and right; only where the denominator is above 0. */
  lambda: Float64Array;
  slopeBefore: Float64Array;
  slopeAfter: Float64Array;
  /** λr falls all the way from node `first` to the last, and no node before `first` has D > 0: one root at most. */
  falling: boolean;
  first: number;
}

const FIRST_CAPACITY = 256;

export function newBranch(): Branch {
  return {
    ready: false,
    count: 0,
    phi: new Float64Array(FIRST_CAPACITY),
    numerator: new Float64Array(FIRST_CAPACITY),
    denominator: new Float64Array(FIRST_CAPACITY),
    lambda: new Float64Array(FIRST_CAPACITY),
    slopeBefore: new Float64Array(FIRST_CAPACITY),
    slopeAfter: new Float64Array(FIRST_CAPACITY),
    falling: false,
    first: 0,
  };
}

function makeRoom(branch: Branch, nodes: number): void {
  if (nodes <= branch.phi.length) return;
  const larger = (old: Float64Array) => {
    const array = new Float64Array(2 * nodes);
    array.set(old);
    return array;
  };
  branch.phi = larger(branch.phi);
  branch.numerator = larger(branch.numerator);
  branch.denominator = larger(branch.denominator);
  branch.lambda = larger(branch.lambda);
  branch.slopeBefore = larger(branch.slopeBefore);
  branch.slopeAfter = larger(branch.slopeAfter);
}

const TURN = 2 * Math.PI;
/** Nodes nearer than this to an end of the range are left out. */
const END_GAP = 1e-9;

/** Takes the balance as it stands, with the slopes to the right, as the node at `i`. */
function take(branch: Branch, i: number, balance: Balance): void {
  const N = balance.numerator;
  const D = balance.denominator;
  const lambda = N / D;
  const slope = (balance.numeratorSlope - lambda * balance.denominatorSlope) / D;
  branch.phi[i] = balance.phi;
  branch.numerator[i] = N;
  branch.denominator[i] = D;
  branch.lambda[i] = lambda;
  branch.slopeBefore[i] = slope;
  branch.slopeAfter[i] = slope;
}

function takePoint(balance: Balance, branch: Branch, i: number, phi: number): void {
  balance.phi = phi;
  evaluateBalance(balance);
  take(branch, i, balance);
}

/** First of the ascending angles above `at`. */
function firstAbove(angles: Float64Array, at: number): number {
  let low = 0;
  let high = angles.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if ((angles[middle] as number) > at) high = middle;
    else low = middle + 1;
  }
  return low;
}

/** A node of the polar as the branch's node at `i`; the slope to its left differs where the polar has a kink there. */
function takeNode(balance: Balance, branch: Branch, i: number, nodes: PolarNodes, k: number): void {
  const clSlope = nodes.clSlopeAfter[k] as number;
  const cdSlope = nodes.cdSlopeAfter[k] as number;
  balance.section.lift = nodes.cl[k] as number;
  balance.section.drag = nodes.cd[k] as number;
  balance.section.liftSlope = clSlope;
  balance.section.dragSlope = cdSlope;
  balanceForces(balance);
  take(branch, i, balance);
  const liftKink = (nodes.clSlopeBefore[k] as number) - clSlope;
  const dragKink = balance.dragShare * ((nodes.cdSlopeBefore[k] as number) - cdSlope);
  const s = balance.sine;
  const c = balance.cosine;
  const cnKink = liftKink * c + dragKink * s;
  const ctKink = liftKink * s - dragKink * c;
  const lambda = branch.lambda[i] as number;
  const change = -balance.sigma * ctKink - lambda * balance.denominatorPerCn * cnKink;
  branch.slopeBefore[i] = (branch.slopeAfter[i] as number) + change / balance.denominator;
}

/** Tabulates the balance over [low, high], which must not hold φ = 0: at its ends and at every node of the polar between. */
export function tabulate(balance: Balance, low: number, high: number, branch: Branch): void {
  const { nodes } = balance.polar;
  const { alpha, sine, cosine } = nodes;
  makeRoom(branch, alpha.length + 2);
  const pitch = balance.pitch;
  const sinPitch = Math.sin(pitch);
  const cosPitch = Math.cos(pitch);
  takePoint(balance, branch, 0, low);
  let count = 1;
  const start = low - pitch;
  let turn = TURN * Math.floor((start - (alpha[0] as number)) / TURN);
  let k = firstAbove(alpha, start - turn + END_GAP);
  for (;;) {
    if (k === alpha.length) {
      k = 0;
      turn += TURN;
    }
    const phi = (alpha[k] as number) + turn + pitch;
    if (phi > high - END_GAP) break;
    const sa = sine[k] as number;
    const ca = cosine[k] as number;
    balance.phi = phi;
    balance.sine = sa * cosPitch + ca * sinPitch;
    balance.cosine = ca * cosPitch - sa * sinPitch;
    takeNode(balance, branch, count, nodes, k);
    count += 1;
    k += 1;
  }
  takePoint(balance, branch, count, high);
  branch.count = count + 1;
  branch.ready = true;
  markFalling(branch);
  if (!branch.falling) insertTurns(balance, branch);
}

function markFalling(branch: Branch): void {
  const { denominator, lambda, slopeBefore, slopeAfter, count } = branch;
  let i = count - 1;
  branch.falling = false;
  if (!((denominator[i] as number) > 0)) return;
  while (i > 0 && (denominator[i - 1] as number) > 0) {
    const falls =
      (lambda[i - 1] as number) > (lambda[i] as number) &&
      (slopeAfter[i - 1] as number) < 0 &&
      (slopeBefore[i] as number) < 0;
    if (!falls) return;
    i -= 1;
  }
  branch.first = i;
  for (i -= 1; i >= 0; i -= 1) if ((denominator[i] as number) > 0) return;
  branch.falling = true;
}

/** Where λr is flat its error is of the order of the square of that in φ: 1° halved 24 times is exact. */
const TURN_STEPS = 24;

/** dλr/dφ times D² at φ: the sign tells where λr(φ) turns. */
function slopeSign(balance: Balance, phi: number): number {
  balance.phi = phi;
  evaluateBalance(balance);
  return balance.numeratorSlope * balance.denominator - balance.numerator * balance.denominatorSlope;
}

/** Where λr(φ) turns between two nodes, the turn becomes a node: then no two roots share a cell. */
function insertTurns(balance: Balance, branch: Branch): void {
  for (let i = 0; i < branch.count - 1; i += 1) {
    if (!((branch.denominator[i] as number) > 0 && (branch.denominator[i + 1] as number) > 0)) continue;
    const rises = (branch.slopeAfter[i] as number) > 0;
    if (rises === (branch.slopeBefore[i + 1] as number) > 0) continue;
    let low = branch.phi[i] as number;
    let high = branch.phi[i + 1] as number;
    for (let step = 0; step < TURN_STEPS; step += 1) {
      const middle = 0.5 * (low + high);
      if (slopeSign(balance, middle) > 0 === rises) low = middle;
      else high = middle;
    }
    const phi = 0.5 * (low + high);
    makeRoom(branch, branch.count + 1);
    const { phi: p, numerator, denominator, lambda, slopeBefore, slopeAfter, count } = branch;
    for (const column of [p, numerator, denominator, lambda, slopeBefore, slopeAfter])
      column.copyWithin(i + 2, i + 1, count);
    takePoint(balance, branch, i + 1, phi);
    branch.count += 1;
    i += 1;
  }
}
