import { evaluateBalance } from './balance.ts';
import type { Polar } from '../airfoil/polar.ts';
import type { LossShape } from './loss.ts';
import type { SolverOptions } from './options.ts';
import type { SectionSolver } from './section-solver.ts';
import { findRoot, newSectionSolver, setElement } from './section-solver.ts';

/**
 * How a section ended. 'converged': a root with residual within 1e-10 of its terms. 'no-load': the loss factor is 0 (a
 * station on the hub or tip radius): force 0, angles undefined. 'no-solution': no admissible root; no numbers.
 */
export type SectionStatus = 'converged' | 'no-load' | 'no-solution';

export interface SectionInput {
  readonly solidity: number;
  readonly localSpeedRatio: number;
  /** Twist plus pitch (rad), positive toward feather. */
  readonly pitchRad: number;
  readonly polar: Polar;
  readonly loss: LossShape;
}

/** State of a solved section; speeds are over the wind speed. `a′` is NaN at standstill, where it is undefined. */
export interface SectionState {
  status: SectionStatus;
  phi: number;
  alpha: number;
  a: number;
  aPrime: number;
  F: number;
  cl: number;
  cd: number;
  cn: number;
  ct: number;
  /** (W/V)² */
  speedSquared: number;
  /** |λr·D − N| over the size of its terms. */
  residual: number;
  multipleRoots: boolean;
}

export function emptyState(): SectionState {
  return {
    status: 'no-load',
    phi: NaN,
    alpha: NaN,
    a: NaN,
    aPrime: NaN,
    F: 0,
    cl: NaN,
    cd: NaN,
    cn: 0,
    ct: 0,
    speedSquared: 0,
    residual: 0,
    multipleRoots: false,
  };
}

const RESIDUAL_TOLERANCE = 1e-10;
const ownSolver = newSectionSolver();

/** True where a loss factor is 0: a station on the hub or tip radius. */
export function carriesNoLoad({ loss }: { readonly loss: LossShape }): boolean {
  return loss.tip <= 0 || loss.hub <= 0;
}

/**
 * Solves one section for its inflow angle.
 * Method: Ning, Wind Energy 17 (2014) 1327–1345, with the pole-free balance tabulated at the polar's rows, the bracket rule of
 * docs/theory.md and Newton's method inside a cell. Returns the state; never throws, never NaN in a converged state save
 * a′ at standstill.
 */
export function solveSection(
  section: SectionInput,
  options: SolverOptions,
  state: SectionState = emptyState(),
): SectionState {
  if (carriesNoLoad(section)) return Object.assign(state, emptyState());
  setElement(ownSolver, section.polar, section.solidity, section.pitchRad, section.loss, options);
  return solveState(ownSolver, section.localSpeedRatio, state);
}

/** The state of the solver's element at a local speed ratio. */
export function solveState(solver: SectionSolver, lambda: number, state: SectionState): SectionState {
  const { balance } = solver;
  balance.lambda = lambda;
  if (!findRoot(solver)) return unsolved(state);
  const phi = balance.root;
  balance.phi = phi;
  evaluateBalance(balance);
  const { sine: s, cosine: c, factor: F, denominator: D, numerator: N } = balance;
  const { lift: cl, drag: cd } = balance.section;
  const mag = Math.abs(s);
  // cos φ is taken as 1: at standstill all terms vanish with it.
  const scale =
    lambda * Math.abs(D) +
    4 * F * mag +
    balance.sigma * (Math.abs(cl) * mag + balance.dragShare * Math.abs(cd));
  const residual = Math.abs(lambda * D - N) / (scale + Number.MIN_VALUE);
  if (!(residual <= RESIDUAL_TOLERANCE)) return unsolved(state);
  // D = 4F|s|h, h = sinφ/(1 − a) = V/W
  const speed = (4 * F * mag) / D;
  const alpha = phi - balance.pitch;
  state.status = 'converged';
  state.phi = phi;
  state.alpha = alpha - 2 * Math.PI * Math.round(alpha / (2 * Math.PI));
  state.F = F;
  state.cl = cl;
  state.cd = cd;
  state.cn = balance.cn;
  state.ct = balance.ct;
  state.speedSquared = speed * speed;
  state.a = 1 - s * speed;
  state.aPrime = lambda > 0 ? (c * speed) / lambda - 1 : NaN;
  state.residual = residual;
  state.multipleRoots = solver.multipleRoots;
  return state;
}

function unsolved(state: SectionState): SectionState {
  return Object.assign(state, emptyState(), {
    status: 'no-solution',
    F: NaN,
    cn: NaN,
    ct: NaN,
    speedSquared: NaN,
    residual: NaN,
  });
}
