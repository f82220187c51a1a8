import { refineGeometry } from '@tipward/bem-solver';
import type { DesignContent } from '@tipward/contract';
import type { AirfoilData } from '../airfoil-data.ts';
import { outlineX, pitchAxisShare, sectionHeights } from './section-outline.ts';

export interface BladeSurface {
  /** x: span (m); y: in the rotor plane, leading edge positive (m); z: downwind (m). Row-major, root row first. */
  readonly positions: Float32Array;
  readonly rows: number;
  readonly columns: number;
}

/**
 * The lofted surface of one blade: sections of the stations, twisted by their twist about the pitch axis.
 * `elements` rows along the span and `points` around each section (first and last coincide at the trailing edge).
 */
export function bladeSurface(
  content: Pick<DesignContent, 'stations'>,
  airfoils: readonly AirfoilData[],
  { elements = 60, points = 80 }: { elements?: number; points?: number } = {},
): BladeSurface {
  const stations = content.stations;
  const first = stations[0];
  const last = stations.at(-1);
  if (first === undefined || last === undefined || stations.length < 2)
    throw new RangeError('A blade surface needs at least 2 stations');
  const span = refineGeometry(stations, first.radiusM, last.radiusM, elements, { includeEnds: true });
  const rows = span.radiusM.length;
  const positions = new Float32Array(rows * points * 3);
  const cache = new Map<string, Float64Array>();
  const atStation = stations.map((s) => sectionHeights(airfoils, s.thicknessPct, s.airfoil, points, cache));
  for (let row = 0; row < rows; row += 1) {
    const below = span.stationIndex[row] ?? 0;
    const share = span.stationFraction[row] ?? 0;
    const thickness = span.thicknessPct[row] ?? 100;
    const a = atStation[below];
    const b = atStation[below + 1] ?? a;
    const chord = span.chordM[row] ?? 0;
    const twist = ((span.twistDeg[row] ?? 0) * Math.PI) / 180;
    const axis = pitchAxisShare(thickness);
    for (let i = 0; i < points; i += 1) {
      const along = (axis - outlineX(i / (points - 1))) * chord;
      const ya = a?.[i] ?? 0;
      const up = (ya + share * ((b?.[i] ?? ya) - ya)) * chord;
      const at = (row * points + i) * 3;
      positions[at] = span.radiusM[row] ?? 0;
      // Positive twist turns the leading edge into the wind (toward feather): upwind is −z.
      positions[at + 1] = along * Math.cos(twist) + up * Math.sin(twist);
      positions[at + 2] = -along * Math.sin(twist) + up * Math.cos(twist);
    }
  }
  return { positions, rows, columns: points };
}
