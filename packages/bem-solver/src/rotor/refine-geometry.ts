import { SolverInputError, requireNumber } from '../input-error.ts';
import { pchipAt, pchipSlopes } from '../numerics/pchip.ts';

export interface BladeStation {
  readonly radiusM: number;
  readonly chordM: number;
  readonly twistDeg: number;
  readonly thicknessPct: number;
}

/** Elements of a refined blade. `stationIndex` and `stationFraction` say between which stations each lies and how far. */
export interface RefinedGeometry {
  readonly radiusM: Float64Array;
  readonly chordM: Float64Array;
  readonly twistDeg: Float64Array;
  readonly thicknessPct: Float64Array;
  readonly stationIndex: Int32Array;
  readonly stationFraction: Float64Array;
}

/**
 * Chord, twist and relative thickness on `elements` cosine-spaced radii between hub and tip: a monotone piecewise cubic
 * through the stations, held constant beyond the first and last. Elements lie at the middle of equal angles, so that none
 * falls on hub or tip; with `includeEnds` the first and last do.
 */
export function refineGeometry(
  stations: readonly BladeStation[],
  hubRadiusM: number,
  tipRadiusM: number,
  elements = 50,
  { includeEnds = false }: { includeEnds?: boolean } = {},
): RefinedGeometry {
  if (stations.length < 2) throw new SolverInputError('stations', stations.length, 'at least 2 stations');
  requireNumber('hubRadiusM', hubRadiusM, 0, tipRadiusM, true);
  requireNumber('elements', elements, 2, 10000);
  const r = stations.map((station) => station.radiusM);
  const column = (pick: (station: BladeStation) => number) => {
    const y = stations.map(pick);
    const slopes = pchipSlopes(r, y);
    return (at: number) => pchipAt(r, y, slopes, at);
  };
  const radiusM = Float64Array.from({ length: elements }, (_, i) => {
    const turn = includeEnds ? i / (elements - 1) : (i + 0.5) / elements;
    return hubRadiusM + 0.5 * (tipRadiusM - hubRadiusM) * (1 - Math.cos(Math.PI * turn));
  });
  const stationIndex = Int32Array.from(radiusM, (at) => {
    const above = r.findIndex((value) => value > at);
    return above === -1 ? stations.length - 2 : Math.max(0, above - 1);
  });
  const stationFraction = Float64Array.from(radiusM, (at, i) => {
    const low = r[stationIndex[i] ?? 0] ?? 0;
    const high = r[(stationIndex[i] ?? 0) + 1] ?? low;
    return Math.min(1, Math.max(0, (at - low) / (high - low)));
  });
  return {
    radiusM,
    chordM: radiusM.map(column((station) => station.chordM)),
    twistDeg: radiusM.map(column((station) => station.twistDeg)),
    thicknessPct: radiusM.map(column((station) => station.thicknessPct)),
    stationIndex,
    stationFraction,
  };
}
