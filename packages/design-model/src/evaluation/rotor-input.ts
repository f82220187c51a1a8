import {
  blendPolars,
  compilePolar,
  compileRotor,
  interpolateReynolds,
  refineGeometry,
} from '@tipward/bem-solver';
import type { PolarTable, Rotor } from '@tipward/bem-solver';
import type { DesignContent, SolverSettings, Specification } from '@tipward/contract';
import type { AirfoilData } from '../airfoil-data.ts';
import { mixFor } from '../airfoil-data.ts';
import { stallAngleDeg } from './stall-angle.ts';

export interface ElementInfo {
  readonly radiusM: number;
  readonly chordM: number;
  readonly twistDeg: number;
  readonly thicknessPct: number;
  readonly stallDeg: number | null;
  /** Range of α the polars were measured or computed in; outside it lies an extension. */
  readonly measuredFromDeg: number;
  readonly measuredToDeg: number;
  readonly reynoldsOutside: boolean;
}
export interface PreparedRotor {
  readonly rotor: Rotor;
  readonly elements: readonly ElementInfo[];
  /** Rotor speed the Reynolds numbers are taken at and spanwise states are shown for (rad/s). */
  readonly rotorSpeedRadS: number;
  /** Airfoils without a polar of the wanted surface state. */
  readonly missingSoiled: readonly string[];
}

interface StationPolar {
  readonly table: PolarTable;
  readonly measuredFromDeg: number;
  readonly measuredToDeg: number;
  readonly outside: boolean;
}

/** The fastest the rotor may turn: the lower of the speed and the tip-speed limit (rad/s). */
function ratedRotorSpeed(spec: Specification): number {
  return Math.min((spec.maxRotorSpeedRpm * Math.PI) / 30, spec.maxTipSpeedMS / spec.tipRadiusM);
}

function airfoilPolar(foil: AirfoilData, settings: SolverSettings, reynolds: number): StationPolar {
  const wanted = foil.polars.filter((p) => p.surfaceState === settings.surfaceState);
  // A section without soiled polars (a cylinder, say) keeps its clean ones; warnings name it.
  const set = (wanted.length > 0 ? wanted : foil.polars).toSorted((a, b) => a.reynolds - b.reynolds);
  const { table, outside } = interpolateReynolds(
    set.map((p) => ({ reynolds: p.reynolds, table: p })),
    reynolds,
  );
  return {
    table,
    outside: outside && set.length > 1,
    measuredFromDeg: Math.max(...set.map((p) => p.measuredFromDeg ?? -180)),
    measuredToDeg: Math.min(...set.map((p) => p.measuredToDeg ?? 180)),
  };
}

function mixPolars(a: StationPolar, b: StationPolar, weightB: number): StationPolar {
  if (weightB === 0 || a === b) return a;
  return {
    table: blendPolars(a.table, b.table, weightB),
    outside: a.outside || b.outside,
    measuredFromDeg: Math.max(a.measuredFromDeg, b.measuredFromDeg),
    measuredToDeg: Math.min(a.measuredToDeg, b.measuredToDeg),
  };
}

function stationPolars(
  content: DesignContent,
  spec: Specification,
  airfoils: readonly AirfoilData[],
  omega: number,
): StationPolar[] {
  return content.stations.map((station) => {
    // The Reynolds number of the rotational speed alone: fixed before the solve, so that no result depends on another.
    const reynolds = Math.max(
      1e3,
      (spec.airDensityKgM3 * omega * station.radiusM * station.chordM) / spec.airViscosityPaS,
    );
    const { a, b, weightB } = mixFor(airfoils, station.thicknessPct, station.airfoil);
    return mixPolars(
      airfoilPolar(a, content.settings, reynolds),
      airfoilPolar(b, content.settings, reynolds),
      weightB,
    );
  });
}

/**
 * A content as the solver takes it: refined onto cosine-spaced elements, each with the polar blended between its
 * neighbouring stations (by relative thickness where it changes, else by span).
 */
export function prepareRotor(
  content: DesignContent,
  spec: Specification,
  airfoils: readonly AirfoilData[],
): PreparedRotor {
  const omega = ratedRotorSpeed(spec);
  const polars = stationPolars(content, spec, airfoils, omega);
  const grid = refineGeometry(content.stations, spec.hubRadiusM, spec.tipRadiusM, content.settings.elements);
  const elements: ElementInfo[] = [];
  const stations = Array.from(grid.radiusM, (radiusM, i) => {
    const below = grid.stationIndex[i] ?? 0;
    const here = content.stations[below];
    const next = content.stations[below + 1];
    const thicknessPct = grid.thicknessPct[i] ?? 100;
    const rise = (next?.thicknessPct ?? 0) - (here?.thicknessPct ?? 0);
    const bySpan = grid.stationFraction[i] ?? 0;
    const share =
      next === undefined || Math.abs(rise) < 1e-9
        ? bySpan
        : Math.min(1, Math.max(0, (thicknessPct - (here?.thicknessPct ?? 0)) / rise));
    const own = polars[below];
    if (own === undefined) throw new RangeError(`stations[${below}] is missing; allowed: 2 to 200 stations`);
    const mixed = mixPolars(own, polars[below + 1] ?? own, share);
    const chordM = grid.chordM[i] ?? 0;
    const twistDeg = grid.twistDeg[i] ?? 0;
    elements.push({
      radiusM,
      chordM,
      twistDeg,
      thicknessPct,
      stallDeg: stallAngleDeg(mixed.table),
      measuredFromDeg: mixed.measuredFromDeg,
      measuredToDeg: mixed.measuredToDeg,
      reynoldsOutside: mixed.outside,
    });
    return { radiusM, chordM, twistDeg, polar: compilePolar(mixed.table, { interpolation: 'linear' }) };
  });
  const rotor = compileRotor(
    { bladeCount: spec.bladeCount, hubRadiusM: spec.hubRadiusM, tipRadiusM: spec.tipRadiusM, stations },
    { densityKgM3: spec.airDensityKgM3, viscosityPaS: spec.airViscosityPaS },
    {
      tipLoss: content.settings.tipLoss,
      hubLoss: content.settings.hubLoss,
      dragInInduction: content.settings.dragInInduction,
      highInduction: content.settings.highInduction,
    },
  );
  const missingSoiled = airfoils
    .filter((foil) => !foil.polars.some((p) => p.surfaceState === 'soiled'))
    .map((foil) => foil.name);
  return { rotor, elements, rotorSpeedRadS: omega, missingSoiled };
}
