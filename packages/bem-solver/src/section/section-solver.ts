import type { Balance } from './balance.ts';
import { newBalance, setBalance } from './balance.ts';
import type { Branch } from './branch.ts';
import { newBranch, tabulate } from './branch.ts';
import type { Polar } from '../airfoil/polar.ts';
import { compilePolar } from '../airfoil/polar.ts';
import type { LossShape } from './loss.ts';
import type { SolverOptions } from './options.ts';
import { rootInCell } from './root.ts';

const EPSILON = 1e-6;
const HALF_PI = Math.PI / 2;

/** Workspace for solving one blade element at any number of local speed ratios; its tables are made when first needed. */
export interface SectionSolver {
  readonly balance: Balance;
  /** (ε, π/2): turbine. */
  readonly ahead: Branch;
  /** (π/2, π − ε): the tangential wind comes from behind. */
  readonly behind: Branch;
  /** (−π/4, −ε): propeller brake. */
  readonly below: Branch;
  /** (−π/2, −ε): looked at only when nothing else has a root. */
  readonly farBelow: Branch;
  multipleRoots: boolean;
}

export function newSectionSolver(): SectionSolver {
  const polar = compilePolar({ alphaDeg: [-180, 180], cl: [0, 0], cd: [0, 0] });
  return {
    balance: newBalance(polar),
    ahead: newBranch(),
    behind: newBranch(),
    below: newBranch(),
    farBelow: newBranch(),
    multipleRoots: false,
  };
}

/** Makes a blade element (twist plus pitch in rad) the one to be solved. */
export function setElement(
  solver: SectionSolver,
  polar: Polar,
  solidity: number,
  pitchRad: number,
  loss: LossShape,
  options: SolverOptions,
): void {
  setBalance(solver.balance, polar, solidity, pitchRad, loss, options);
  solver.ahead.ready = false;
  solver.behind.ready = false;
  solver.below.ready = false;
  solver.farBelow.ready = false;
}

function need(solver: SectionSolver, branch: Branch, low: number, high: number): Branch {
  if (!branch.ready) tabulate(solver.balance, low, high, branch);
  return branch;
}

function ahead(solver: SectionSolver): Branch {
  return need(solver, solver.ahead, EPSILON, HALF_PI);
}

function residualAt(branch: Branch, node: number, lambda: number): number {
  return lambda * (branch.denominator[node] as number) - (branch.numerator[node] as number);
}

/** Solves in a cell; true where the root is one the air passes through the way φ says (D > 0). */
function tryCell(solver: SectionSolver, branch: Branch, cell: number): boolean {
  if (!rootInCell(solver.balance, branch, cell)) return false;
  const { balance } = solver;
  return balance.denominator + balance.step * balance.denominatorSlope > 0;
}

/** The one cell of a falling branch that holds λr; −1 where there is none. */
function fallingCell(branch: Branch, lambda: number): number {
  let low = branch.first;
  let high = branch.count - 1;
  if (lambda > (branch.lambda[low] as number)) return low - 1;
  if (lambda < (branch.lambda[high] as number)) return -1;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if ((branch.lambda[middle] as number) >= lambda) low = middle;
    else high = middle;
  }
  return low;
}

/** |α| of the root found, brought to [0, π]. */
function attack({ balance }: SectionSolver): number {
  const alpha = balance.root - balance.pitch;
  return Math.abs(alpha - 2 * Math.PI * Math.round(alpha / (2 * Math.PI)));
}

interface Choice {
  branch: Branch | null;
  cell: number;
  attack: number;
  count: number;
}

/** Looks at every cell of a branch and keeps the admissible root of least |α|. */
function scan(solver: SectionSolver, branch: Branch, lambda: number, choice: Choice): void {
  let before = residualAt(branch, 0, lambda);
  for (let cell = 0; cell < branch.count - 1; cell += 1) {
    const after = residualAt(branch, cell + 1, lambda);
    const crosses = before === 0 ? after !== 0 : before * after < 0;
    before = after;
    if (!crosses || !tryCell(solver, branch, cell)) continue;
    choice.count += 1;
    const size = attack(solver);
    if (size >= choice.attack) continue;
    choice.branch = branch;
    choice.cell = cell;
    choice.attack = size;
  }
}

/**
 * Which root: of several in the bracket the one with the least |α|, down to attached flow. The rule looks at nothing but
 * the section and its local speed ratio, so that no result depends on which other points were computed.
 */
function chosen(solver: SectionSolver, branches: readonly Branch[], lambda: number): boolean {
  const choice: Choice = { branch: null, cell: 0, attack: Infinity, count: 0 };
  for (const branch of branches) scan(solver, branch, lambda, choice);
  solver.multipleRoots = choice.count > 1;
  if (choice.branch === null) return false;
  return choice.count === 1 && attack(solver) === choice.attack
    ? true
    : tryCell(solver, choice.branch, choice.cell);
}

/** The bracket the root is sought in; see docs/theory.md, 'Which root'. */
function bracketOf(solver: SectionSolver, lambda: number): Branch {
  const turbine = ahead(solver);
  if (residualAt(turbine, turbine.count - 1, lambda) < 0)
    return need(solver, solver.behind, HALF_PI, Math.PI - EPSILON);
  if (residualAt(turbine, 0, lambda) < 0) return turbine;
  return need(solver, solver.below, -Math.PI / 4, -EPSILON);
}

/**
 * Finds the section's root at the local speed ratio set in the balance: true, with the balance at the root and
 * `multipleRoots` set, or false where there is no admissible root. Depends on nothing but the element, the options and the
 * ratio.
 */
export function findRoot(solver: SectionSolver): boolean {
  const lambda = solver.balance.lambda;
  solver.multipleRoots = false;
  const branch = bracketOf(solver, lambda);
  if (branch.falling) {
    const cell = fallingCell(branch, lambda);
    if (cell >= 0 && tryCell(solver, branch, cell)) return true;
  }
  return findAmong(solver, branch, lambda);
}

function findAmong(solver: SectionSolver, branch: Branch, lambda: number): boolean {
  if (chosen(solver, [branch], lambda)) return true;
  const everywhere = [
    need(solver, solver.farBelow, -HALF_PI, -EPSILON),
    ahead(solver),
    need(solver, solver.behind, HALF_PI, Math.PI - EPSILON),
  ];
  return chosen(solver, everywhere, lambda);
}
