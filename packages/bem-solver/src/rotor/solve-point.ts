import { requireNumber } from '../input-error.ts';
import { newSectionSolver } from '../section/section-solver.ts';
import type { SectionState, SectionStatus } from '../section/solve-section.ts';
import { emptyState, solveState } from '../section/solve-section.ts';
import type { Rotor, RotorElement } from './rotor.ts';
import { addLoads, EDGE, FLAP, LOAD_PLACES, takeElement, THRUST, TORQUE } from './unit-loads.ts';

export interface OperatingState {
  readonly windSpeedMS: number;
  readonly rotorSpeedRadS: number;
  readonly pitchDeg: number;
}

/** 'converged': every section solved. 'sections-unsolved': some have no admissible solution, so totals are null. */
export type PointStatus = 'converged' | 'sections-unsolved';

export interface SectionResult {
  readonly radiusM: number;
  readonly status: SectionStatus;
  readonly inflowDeg: number | null;
  readonly alphaDeg: number | null;
  readonly axialInduction: number | null;
  readonly tangentialInduction: number | null;
  readonly lossFactor: number | null;
  readonly cl: number | null;
  readonly cd: number | null;
  readonly relativeSpeedMS: number | null;
  readonly normalForceNM: number | null;
  readonly tangentialForceNM: number | null;
  readonly reynolds: number | null;
  readonly multipleRoots: boolean;
}

export interface PointResult {
  readonly windSpeedMS: number;
  readonly rotorSpeedRpm: number;
  readonly tipSpeedRatio: number;
  readonly pitchDeg: number;
  readonly status: PointStatus;
  /** Indices of the stations without a solution. */
  readonly failedStations: readonly number[];
  readonly cp: number | null;
  readonly ct: number | null;
  readonly cq: number | null;
  readonly powerW: number | null;
  readonly thrustN: number | null;
  readonly torqueNm: number | null;
  readonly rootFlapMomentNm: number | null;
  readonly rootEdgeMomentNm: number | null;
  readonly sections?: readonly SectionResult[];
}

const DEG = 180 / Math.PI;
const solver = newSectionSolver();

/** Null for what is not a finite number; adding 0 turns −0 into 0. */
const orNull = (value: number) => (Number.isFinite(value) ? value + 0 : null);

function sectionResult(
  rotor: Rotor,
  element: RotorElement,
  state: SectionState,
  windSpeedMS: number,
): SectionResult {
  const solved = state.status === 'converged';
  const speed = Math.sqrt(state.speedSquared) * windSpeedMS;
  const pressure = 0.5 * rotor.air.densityKgM3 * state.speedSquared * windSpeedMS ** 2 * element.chordM;
  const when = (value: number) => (solved ? orNull(value) : null);
  const noLoad = state.status === 'no-load';
  return {
    radiusM: element.radiusM,
    status: state.status,
    inflowDeg: when(state.phi * DEG),
    alphaDeg: when(state.alpha * DEG),
    axialInduction: when(state.a),
    tangentialInduction: when(state.aPrime),
    lossFactor: noLoad ? 0 : when(state.F),
    cl: when(state.cl),
    cd: when(state.cd),
    relativeSpeedMS: when(speed),
    normalForceNM: noLoad ? 0 : when(pressure * state.cn),
    tangentialForceNM: noLoad ? 0 : when(pressure * state.ct),
    reynolds: when((rotor.air.densityKgM3 * speed * element.chordM) / rotor.air.viscosityPaS),
    multipleRoots: state.multipleRoots,
  };
}

/**
 * One operating point.
 * @param point wind speed [m/s] > 0, rotor speed [rad/s] ≥ 0, pitch [°] within ±360
 * @returns totals and, asked for, the sections; null where undefined, never NaN
 * Source: blade-element momentum theory as in docs/theory.md; integration by trapezoid over [Rh, stations, R].
 * Throws SolverInputError on misuse.
 */
export function solvePoint(
  rotor: Rotor,
  point: OperatingState,
  { sections = false }: { sections?: boolean } = {},
): PointResult {
  const wind = requireNumber('windSpeedMS', point.windSpeedMS, 0, Infinity, true);
  const omega = requireNumber('rotorSpeedRadS', point.rotorSpeedRadS, 0);
  requireNumber('pitchDeg', point.pitchDeg, -360, 360);
  const tipSpeedRatio = (omega * rotor.tipRadiusM) / wind;
  const failedStations: number[] = [];
  const rows: SectionResult[] = [];
  const loads = new Float64Array(LOAD_PLACES);
  rotor.elements.forEach((element, index) => {
    const loaded = takeElement(rotor, element, point.pitchDeg / DEG, solver);
    if (loaded && !addLoads(rotor, element, solver, tipSpeedRatio, loads)) failedStations.push(index);
    if (!sections) return;
    const state = emptyState();
    if (loaded) solveState(solver, (tipSpeedRatio * element.radiusM) / rotor.tipRadiusM, state);
    rows.push(sectionResult(rotor, element, state, wind));
  });
  const solved = failedStations.length === 0;
  const area = Math.PI * rotor.tipRadiusM ** 2;
  const pressure = 0.5 * rotor.air.densityKgM3 * wind * wind;
  const when = (value: number) => (solved ? orNull(value) : null);
  const load = (place: number) => loads[place] as number;
  const cq = load(TORQUE) / (area * rotor.tipRadiusM);
  return {
    windSpeedMS: wind,
    rotorSpeedRpm: (omega * 30) / Math.PI,
    tipSpeedRatio,
    pitchDeg: point.pitchDeg,
    status: solved ? 'converged' : 'sections-unsolved',
    failedStations,
    cp: when(cq * tipSpeedRatio),
    ct: when(load(THRUST) / area),
    cq: when(cq),
    powerW: when(load(TORQUE) * pressure * omega),
    thrustN: when(load(THRUST) * pressure),
    torqueNm: when(load(TORQUE) * pressure),
    rootFlapMomentNm: when(load(FLAP) * pressure),
    rootEdgeMomentNm: when(load(EDGE) * pressure),
    ...(sections ? { sections: rows } : {}),
  };
}
