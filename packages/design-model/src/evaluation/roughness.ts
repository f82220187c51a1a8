import type { Station } from '@tipward/contract';

interface Roughness {
  readonly value: number;
  readonly station: number | null;
}

/**
 * Largest departure of a station from the straight line between its neighbours, at its own radius: a second difference
 * that does not depend on how far apart the stations stand on a straight stretch.
 */
function largestDeparture(stations: readonly Station[], pick: (station: Station) => number): Roughness {
  let worst: Roughness = { value: 0, station: null };
  for (let i = 1; i < stations.length - 1; i += 1) {
    const before = stations[i - 1];
    const here = stations[i];
    const after = stations[i + 1];
    if (before === undefined || here === undefined || after === undefined) continue;
    const share = (here.radiusM - before.radiusM) / (after.radiusM - before.radiusM);
    const line = pick(before) + share * (pick(after) - pick(before));
    const value = Math.abs(pick(here) - line);
    if (value > worst.value) worst = { value, station: i };
  }
  return worst;
}

/** In % of the tip radius. */
export function chordRoughnessPct(stations: readonly Station[], tipRadiusM: number): Roughness {
  return largestDeparture(stations, (s) => (100 * s.chordM) / tipRadiusM);
}

/** In degrees. */
export function twistRoughnessDeg(stations: readonly Station[]): Roughness {
  return largestDeparture(stations, (s) => s.twistDeg);
}
