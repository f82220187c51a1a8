import type { Polar } from '../airfoil/polar.ts';
import { SolverInputError, requireNumber } from '../input-error.ts';
import type { LossShape } from '../section/loss.ts';
import type { SolverOptions } from '../section/options.ts';
import { resolveOptions } from '../section/options.ts';

export interface RotorStation {
  /** m, hub radius ≤ r ≤ tip radius, ascending. */
  readonly radiusM: number;
  /** m, ≥ 0. */
  readonly chordM: number;
  /** °, positive toward feather. */
  readonly twistDeg: number;
  readonly polar: Polar;
}

export interface RotorGeometry {
  readonly bladeCount: number;
  readonly hubRadiusM: number;
  readonly tipRadiusM: number;
  readonly stations: readonly RotorStation[];
}

export interface Air {
  readonly densityKgM3: number;
  readonly viscosityPaS: number;
}

/** ISA sea level (ISO 2533). */
export const STANDARD_AIR: Air = { densityKgM3: 1.225, viscosityPaS: 1.7894e-5 };

export interface RotorElement {
  readonly radiusM: number;
  readonly chordM: number;
  readonly twistRad: number;
  readonly polar: Polar;
  readonly solidity: number;
  readonly loss: LossShape;
  /** Weight of the element's load in ∫ dr by trapezoid over [Rh, stations, R] (m). */
  readonly widthM: number;
}

export interface Rotor {
  readonly bladeCount: number;
  readonly hubRadiusM: number;
  readonly tipRadiusM: number;
  readonly elements: readonly RotorElement[];
  readonly air: Air;
  readonly options: SolverOptions;
}

function lossShape(geometry: RotorGeometry, options: SolverOptions, r: number): LossShape {
  const half = geometry.bladeCount / 2;
  return {
    tip: options.tipLoss ? (half * (geometry.tipRadiusM - r)) / r : Infinity,
    hub: options.hubLoss ? (half * (r - geometry.hubRadiusM)) / geometry.hubRadiusM : Infinity,
  };
}

function checkStations(geometry: RotorGeometry): void {
  const { stations, hubRadiusM, tipRadiusM } = geometry;
  if (stations.length < 1) throw new SolverInputError('rotor.stations', 'empty', 'at least 1 station');
  stations.forEach((station, i) => {
    const at = `rotor.stations[${i}]`;
    requireNumber(`${at}.radiusM`, station.radiusM, hubRadiusM, tipRadiusM);
    requireNumber(`${at}.chordM`, station.chordM, 0);
    requireNumber(`${at}.twistDeg`, station.twistDeg, -360, 360);
    const before = stations[i - 1];
    if (before !== undefined && station.radiusM <= before.radiusM)
      throw new SolverInputError(
        `${at}.radiusM`,
        station.radiusM,
        `above the station before, ${before.radiusM} m`,
      );
  });
}

/**
 * A rotor ready for the kernel. Loads vanish at hub and tip radius, which close the trapezoid where no station stands there.
 * Throws SolverInputError on radii out of order or out of [hub, tip], negative chord, no blades, wrong air or options.
 */
export function compileRotor(
  geometry: RotorGeometry,
  air: Air = STANDARD_AIR,
  options: Partial<SolverOptions> = {},
): Rotor {
  const resolved = resolveOptions(options);
  requireNumber('rotor.bladeCount', geometry.bladeCount, 1, 100);
  if (!Number.isInteger(geometry.bladeCount))
    throw new SolverInputError('rotor.bladeCount', geometry.bladeCount, 'a whole number');
  requireNumber('rotor.hubRadiusM', geometry.hubRadiusM, 0, geometry.tipRadiusM, true);
  requireNumber('rotor.tipRadiusM', geometry.tipRadiusM, geometry.hubRadiusM, Infinity, true);
  requireNumber('air.densityKgM3', air.densityKgM3, 0, Infinity, true);
  requireNumber('air.viscosityPaS', air.viscosityPaS, 0, Infinity, true);
  checkStations(geometry);
  const radii = geometry.stations.map((station) => station.radiusM);
  const elements = geometry.stations.map((station, i): RotorElement => {
    const before = radii[i - 1] ?? geometry.hubRadiusM;
    const after = radii[i + 1] ?? geometry.tipRadiusM;
    return {
      radiusM: station.radiusM,
      chordM: station.chordM,
      twistRad: (station.twistDeg * Math.PI) / 180,
      polar: station.polar,
      solidity: (geometry.bladeCount * station.chordM) / (2 * Math.PI * station.radiusM),
      loss: lossShape(geometry, resolved, station.radiusM),
      widthM: 0.5 * (after - before),
    };
  });
  return {
    bladeCount: geometry.bladeCount,
    hubRadiusM: geometry.hubRadiusM,
    tipRadiusM: geometry.tipRadiusM,
    elements,
    air,
    options: resolved,
  };
}
