import type { SectionSolver } from '../section/section-solver.ts';
import { findRoot, setElement } from '../section/section-solver.ts';
import { carriesNoLoad } from '../section/solve-section.ts';
import type { Rotor, RotorElement } from './rotor.ts';

/**
 * Loads over ½ρV² in four places of an array: thrust and torque of the rotor, root moments of a blade. NaN where a section has
 * no solution.
 */
export const THRUST = 0;
export const TORQUE = 1;
export const FLAP = 2;
export const EDGE = 3;
export const LOAD_PLACES = 4;

/** Makes an element at a pitch (rad) the solver's; false where it carries no load. */
export function takeElement(
  rotor: Rotor,
  element: RotorElement,
  pitch: number,
  solver: SectionSolver,
): boolean {
  if (carriesNoLoad(element)) return false;
  setElement(solver, element.polar, element.solidity, element.twistRad + pitch, element.loss, rotor.options);
  return true;
}

/**
 * Solves the solver's element at the ratio set in its balance and adds the load at `at`; false where it has no solution. The
 * balance stands one last Newton step from the root: the loads are carried there to first order, the rest being of the order of
 * 1e-11 of them.
 */
function addSolved(
  rotor: Rotor,
  element: RotorElement,
  solver: SectionSolver,
  loads: Float64Array,
  at: number,
): boolean {
  if (!findRoot(solver)) {
    loads.fill(NaN, at, at + LOAD_PLACES);
    return false;
  }
  const { balance } = solver;
  const step = balance.step;
  const s = balance.sine;
  const D = balance.denominator;
  const F = balance.factor;
  const growth = balance.denominatorSlope / D - balance.factorSlope / F - balance.cosine / s;
  // W/V = (1 − a)/sin φ = 4F|s|/D
  const speed = ((4 * F * Math.abs(s)) / D) * (1 - step * growth);
  const pressure = speed * speed * element.chordM * element.widthM;
  const normal = pressure * (balance.cn + step * balance.cnSlope);
  const tangential = pressure * (balance.ct + step * balance.ctSlope);
  const arm = element.radiusM - rotor.hubRadiusM;
  loads[at] = (loads[at] as number) + normal * rotor.bladeCount;
  loads[at + TORQUE] = (loads[at + TORQUE] as number) + tangential * element.radiusM * rotor.bladeCount;
  loads[at + FLAP] = (loads[at + FLAP] as number) + normal * arm;
  loads[at + EDGE] = (loads[at + EDGE] as number) + tangential * arm;
  return true;
}

/** The same at a tip-speed ratio of the rotor. */
export function addLoads(
  rotor: Rotor,
  element: RotorElement,
  solver: SectionSolver,
  tipSpeedRatio: number,
  loads: Float64Array,
): boolean {
  solver.balance.lambda = (tipSpeedRatio * element.radiusM) / rotor.tipRadiusM;
  return addSolved(rotor, element, solver, loads, 0);
}

/** Adds an element's loads at each tip-speed ratio, four places a ratio. */
export function addCurve(
  rotor: Rotor,
  element: RotorElement,
  solver: SectionSolver,
  ratios: Float64Array,
  loads: Float64Array,
): void {
  const { balance } = solver;
  for (let i = 0; i < ratios.length; i += 1) {
    balance.lambda = ((ratios[i] as number) * element.radiusM) / rotor.tipRadiusM;
    addSolved(rotor, element, solver, loads, i * LOAD_PLACES);
  }
}

/** Loads of the whole rotor at one tip-speed ratio and pitch (°). */
export function unitLoads(
  rotor: Rotor,
  tipSpeedRatio: number,
  pitchDeg: number,
  solver: SectionSolver,
): Float64Array {
  const loads = new Float64Array(LOAD_PLACES);
  const pitch = (pitchDeg * Math.PI) / 180;
  for (const element of rotor.elements)
    if (takeElement(rotor, element, pitch, solver)) addLoads(rotor, element, solver, tipSpeedRatio, loads);
  return loads;
}
