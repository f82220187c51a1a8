import {
  CN,
  CN_SLOPE,
  COSINE,
  CT,
  CT_SLOPE,
  DENOMINATOR,
  DENOMINATOR_SLOPE,
  FACTOR,
  FACTOR_SLOPE,
  SINE,
  STEP,
} from '../section/balance.ts';
import type { SectionSolver } from '../section/section-solver.ts';
import { findRoot, setElement } from '../section/section-solver.ts';
import { carriesNoLoad } from '../section/solve-section.ts';
import type { Rotor, RotorElement } from './rotor.ts';

/** Loads over ½ρV²: thrust and torque of the rotor, root moments of a blade. NaN where a section has no solution. */
export interface UnitLoads {
  thrust: number;
  torque: number;
  flap: number;
  edge: number;
}

export function newLoads(): UnitLoads {
  return { thrust: 0, torque: 0, flap: 0, edge: 0 };
}

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
 * Solves the solver's element at a tip-speed ratio and adds its load; false where it has no solution. The record stands one
 * last Newton step from the root: the loads are carried there to first order, the rest being of the square of 2e-8.
 */
export function addLoads(
  rotor: Rotor,
  element: RotorElement,
  solver: SectionSolver,
  tipSpeedRatio: number,
  loads: UnitLoads,
): boolean {
  if (!findRoot(solver, (tipSpeedRatio * element.radiusM) / rotor.tipRadiusM)) {
    loads.thrust = loads.torque = loads.flap = loads.edge = NaN;
    return false;
  }
  const { record } = solver.balance;
  const step = record[STEP] as number;
  const s = record[SINE] as number;
  const D = record[DENOMINATOR] as number;
  const F = record[FACTOR] as number;
  const growth =
    (record[DENOMINATOR_SLOPE] as number) / D -
    (record[FACTOR_SLOPE] as number) / F -
    (record[COSINE] as number) / s;
  // W/V = (1 − a)/sin φ = 4F|s|/D
  const speed = ((4 * F * Math.abs(s)) / D) * (1 - step * growth);
  const pressure = speed * speed * element.chordM * element.widthM;
  const normal = pressure * ((record[CN] as number) + step * (record[CN_SLOPE] as number));
  const tangential = pressure * ((record[CT] as number) + step * (record[CT_SLOPE] as number));
  const arm = element.radiusM - rotor.hubRadiusM;
  loads.thrust += normal * rotor.bladeCount;
  loads.torque += tangential * element.radiusM * rotor.bladeCount;
  loads.flap += normal * arm;
  loads.edge += tangential * arm;
  return true;
}

/** Loads of the whole rotor at one tip-speed ratio and pitch (°). */
export function unitLoads(
  rotor: Rotor,
  tipSpeedRatio: number,
  pitchDeg: number,
  solver: SectionSolver,
): UnitLoads {
  const loads = newLoads();
  const pitch = (pitchDeg * Math.PI) / 180;
  for (const element of rotor.elements)
    if (takeElement(rotor, element, pitch, solver)) addLoads(rotor, element, solver, tipSpeedRatio, loads);
  return loads;
}
