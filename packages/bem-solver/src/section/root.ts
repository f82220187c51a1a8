import { evaluateBalance } from './balance.ts';
import type { Balance } from './balance.ts';
import type { Branch } from './branch.ts';

/**
 * Newton's last step is taken without looking again where it changes D and sin φ by less than this share: what is left is of
 * the order of its square. Only where the curve is smooth, i.e. with Buhl's relation and no row of the polar in between.
 */
const LAST_CHANGE = 3e-6;
const MAX_STEPS = 120;

/** Start in a cell: φ as a cubic of λr between the nodes where both slopes allow it, else the chord of the balance. */
function startIn(branch: Branch, cell: number, lambda: number): number {
  const x0 = branch.phi[cell] as number;
  const width = (branch.phi[cell + 1] as number) - x0;
  const D0 = branch.denominator[cell] as number;
  const D1 = branch.denominator[cell + 1] as number;
  if (D0 > 0 && D1 > 0) {
    const l0 = branch.lambda[cell] as number;
    const rise = (branch.lambda[cell + 1] as number) - l0;
    const m0 = rise / (branch.slopeAfter[cell] as number);
    const m1 = rise / (branch.slopeBefore[cell + 1] as number);
    if (m0 > 0 && m1 > 0 && m0 < 4 * width && m1 < 4 * width) {
      const t = (lambda - l0) / rise;
      return x0 + t * (m0 + t * (3 * width - 2 * m0 - m1 + t * (m0 + m1 - 2 * width)));
    }
  }
  const g0 = lambda * D0 - (branch.numerator[cell] as number);
  const g1 = lambda * D1 - (branch.numerator[cell + 1] as number);
  const share = g0 / (g0 - g1);
  return x0 + width * (share > 0 && share < 1 ? share : 0.5);
}

/** True: the root is `step` from where the balance was evaluated. */
function arrived(balance: Balance, step: number): boolean {
  balance.root = balance.phi + step;
  balance.step = step;
  return true;
}

/**
 * The root of λr·D − N at the balance's λr in a cell of the branch, by Newton's method kept inside the cell by bisection. Stops
 * when the next step changes the balance by less than 3e-6 of itself on a smooth piece (the step is then taken), or is below
 * the spacing of numbers.
 * @returns whether it converged; the root and the last step are in the balance
 */
export function rootInCell(balance: Balance, branch: Branch, cell: number): boolean {
  const lambda = balance.lambda;
  let low = branch.phi[cell] as number;
  let high = branch.phi[cell + 1] as number;
  const atLow = lambda * (branch.denominator[cell] as number) - (branch.numerator[cell] as number);
  const lastChange = balance.relation === 'buhl' ? LAST_CHANGE : 0;
  let phi = startIn(branch, cell, lambda);
  if (!(phi >= low && phi <= high)) phi = 0.5 * (low + high);
  for (let count = 0; count < MAX_STEPS; count += 1) {
    balance.phi = phi;
    evaluateBalance(balance);
    const g = lambda * balance.denominator - balance.numerator;
    const step = -g / (lambda * balance.denominatorSlope - balance.numeratorSlope);
    const next = phi + step;
    const size = Math.abs(step);
    // Convergence comes before the look at the bracket: rounding may put a converged step just outside.
    const D = balance.denominator;
    const change = size * (Math.abs(balance.denominatorSlope * balance.sine) + Math.abs(D));
    const small = change <= lastChange * Math.abs(D * balance.sine);
    if (small && next >= balance.phiFrom && next <= balance.phiTo) return arrived(balance, step);
    if (size <= 4e-16 * (Math.abs(phi) + 1e-3)) return arrived(balance, step);
    if (g * atLow > 0) low = phi;
    else high = phi;
    if (high - low <= 4e-16 * Math.abs(phi) || g === 0) return arrived(balance, 0);
    phi = next > low && next < high ? next : 0.5 * (low + high);
  }
  return false;
}
