import type { Polar } from '../airfoil/polar.ts';
import { lookUp } from '../airfoil/polar.ts';
import { brent } from '../numerics/root.ts';
import { inverseOneMinusA, switchKappa } from './high-induction.ts';
import type { LossShape } from './loss.ts';
import { lossFactor } from './loss.ts';
import type { SolverOptions } from './options.ts';

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

const EPSILON = 1e-6;
const HALF_PI = Math.PI / 2;
/** Stall hysteresis needs solidity: below this no second root was met in a million random sections. */
const SCAN_SOLIDITY = 0.12;
const SCAN_CELLS = 40;
const RESIDUAL_TOLERANCE = 1e-10;

/** Terms of the balance at one inflow angle; one record is reused by a section's whole search. */
interface Terms {
  F: number;
  cl: number;
  cd: number;
  /** sin φ/(1 − a) */
  h: number;
  g: number;
  /** Size of the terms of g; cos φ is taken as 1, for at standstill all terms vanish with it. */
  scale: number;
  admissible: boolean;
}

const coefficients = new Float64Array(2);

/**
 * The pole-free residual: momentum 4Fs(λr·s − c) + σ′(λr·cn + ct), high induction 4Fs(λr·h − c) + σ′ct, both zero where
 * sinφ/(1 − a) = (cosφ/λr)(1 − κ′) (Ning 2014); the same with |s| in front below the rotor plane.
 */
function evaluate(section: SectionInput, options: SolverOptions, phi: number, out: Terms): number {
  const s = Math.sin(phi);
  const c = Math.cos(phi);
  const mag = Math.abs(s);
  lookUp(section.polar, phi - section.pitchRad, coefficients);
  const cl = coefficients[0] as number;
  const cd = coefficients[1] as number;
  const drag = options.dragInInduction ? cd : 0;
  const cn = cl * c + drag * s;
  const ct = cl * s - drag * c;
  const { solidity: sigma, localSpeedRatio: lambda } = section;
  const F = lossFactor(section.loss, mag);
  const kappaTimes4Fs2 = sigma * cn;
  const switched = s > 0 && kappaTimes4Fs2 > switchKappa(options.highInduction) * 4 * F * s * s;
  out.F = F;
  out.cl = cl;
  out.cd = cd;
  if (switched) {
    out.h =
      options.highInduction === 'buhl'
        ? s * (5 / 3 - F) + Math.sqrt(Math.max(0, kappaTimes4Fs2 / 2 - F * (4 / 3 - F) * s * s))
        : s * inverseOneMinusA(options.highInduction, kappaTimes4Fs2 / (4 * F * s * s), F);
    out.g = 4 * F * s * (lambda * out.h - c) + sigma * ct;
    out.scale = 4 * F * s * (lambda * out.h + 1) + sigma * (Math.abs(cl * s) + Math.abs(drag));
    out.admissible = true;
    return out.g;
  }
  out.h = s + ((s < 0 ? -1 : 1) * kappaTimes4Fs2) / (4 * F * mag);
  out.g = 4 * F * mag * (lambda * s - c) + sigma * (lambda * cn + ct);
  out.scale =
    4 * F * mag * (lambda * mag + 1) +
    sigma * ((lambda * Math.abs(c) + mag) * Math.abs(cl) + (lambda * mag + 1) * Math.abs(drag));
  // The air must pass the way the inflow angle says: sinφ(1 − a) > 0.
  out.admissible = s < 0 ? kappaTimes4Fs2 > 4 * F * s * s : 4 * F * s * s + kappaTimes4Fs2 > 0;
  return out.g;
}

function newTerms(): Terms {
  return { F: 0, cl: 0, cd: 0, h: 0, g: 0, scale: 0, admissible: false };
}

interface Root {
  readonly phi: number;
  readonly attack: number;
}

/** Angle of attack brought to (−π, π]. */
function wrapped(angle: number): number {
  return angle - 2 * Math.PI * Math.round(angle / (2 * Math.PI));
}

/** Admissible roots in [low, high], found cell by cell. */
function rootsWithin(
  f: (phi: number) => number,
  admissible: (phi: number) => boolean,
  low: number,
  high: number,
  cells: number,
  pitch: number,
): Root[] {
  const roots: Root[] = [];
  let x0 = low;
  let f0 = f(x0);
  for (let i = 1; i <= cells; i += 1) {
    const x1 = low + ((high - low) * i) / cells;
    const f1 = f(x1);
    if (f0 === 0 || f0 * f1 < 0) {
      const phi = f0 === 0 ? x0 : brent(f, x0, x1).x;
      if (admissible(phi)) roots.push({ phi, attack: Math.abs(wrapped(phi - pitch)) });
    }
    x0 = x1;
    f0 = f1;
  }
  return roots;
}

/**
 * Which root: of several, the one with the least |α| (down to attached flow). Looks at nothing but the section, so that no
 * result depends on which other points were computed.
 */
function leastAttack(roots: readonly Root[]): Root | null {
  return roots.reduce<Root | null>(
    (best, root) => (best === null || root.attack < best.attack ? root : best),
    null,
  );
}

/** The bracket the root is sought in; see docs/theory.md, 'Which root'. */
function bracket(f: (phi: number) => number): [number, number] {
  if (f(HALF_PI) < 0) return [HALF_PI, Math.PI - EPSILON];
  if (f(EPSILON) < 0) return [EPSILON, HALF_PI];
  return [-Math.PI / 4, -EPSILON];
}

/**
 * Solves one section for its inflow angle.
 * Method: Ning, Wind Energy 17 (2014) 1327–1345, with the pole-free residual and the bracket rule of docs/theory.md; Brent's
 * search to 1e-14 rad. Returns the state; never throws, never NaN in a converged state save a′ at standstill.
 */
export function solveSection(
  section: SectionInput,
  options: SolverOptions,
  state: SectionState = emptyState(),
): SectionState {
  if (section.loss.tip <= 0 || section.loss.hub <= 0) return Object.assign(state, emptyState());
  const terms = newTerms();
  const f = (phi: number) => evaluate(section, options, phi, terms);
  const admissible = (phi: number) => {
    f(phi);
    return terms.admissible;
  };
  const [low, high] = bracket(f);
  let multipleRoots = false;
  let phi = NaN;
  if (section.solidity < SCAN_SOLIDITY) {
    const found = brent(f, low, high);
    if (found.status === 'converged' && admissible(found.x)) phi = found.x;
  } else {
    const roots = rootsWithin(f, admissible, low, high, SCAN_CELLS, section.pitchRad);
    multipleRoots = roots.length > 1;
    phi = leastAttack(roots)?.phi ?? NaN;
  }
  if (Number.isNaN(phi)) {
    const roots = rootsWithin(f, admissible, -HALF_PI, Math.PI - EPSILON, 4 * SCAN_CELLS, section.pitchRad);
    multipleRoots = roots.length > 1;
    phi = leastAttack(roots)?.phi ?? NaN;
  }
  return fill(state, section, terms, f, phi, multipleRoots);
}

function fill(
  state: SectionState,
  section: SectionInput,
  terms: Terms,
  f: (phi: number) => number,
  phi: number,
  multipleRoots: boolean,
): SectionState {
  if (Number.isNaN(phi))
    return Object.assign(state, emptyState(), {
      status: 'no-solution',
      F: NaN,
      cn: NaN,
      ct: NaN,
      speedSquared: NaN,
      residual: NaN,
    });
  const residual = Math.abs(f(phi)) / (terms.scale + Number.MIN_VALUE);
  const s = Math.sin(phi);
  const c = Math.cos(phi);
  const { F, cl, cd, h } = terms;
  state.status = residual <= RESIDUAL_TOLERANCE ? 'converged' : 'no-solution';
  state.phi = phi;
  state.alpha = wrapped(phi - section.pitchRad);
  state.F = F;
  state.cl = cl;
  state.cd = cd;
  state.cn = cl * c + cd * s;
  state.ct = cl * s - cd * c;
  const speed = 1 / h;
  state.speedSquared = speed * speed;
  state.a = 1 - s * speed;
  state.aPrime = section.localSpeedRatio > 0 ? (c * speed) / section.localSpeedRatio - 1 : NaN;
  state.residual = residual;
  state.multipleRoots = multipleRoots;
  return state;
}
