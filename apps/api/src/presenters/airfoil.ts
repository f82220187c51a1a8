import type { Airfoil, AirfoilSummary, PolarData } from '@tipward/contract';
import type { PersonRefs } from './person-ref.ts';

export interface AirfoilRow {
  readonly id: string;
  readonly name: string;
  readonly thicknessPct: number;
  readonly note: string;
  readonly outline: Airfoil['outline'];
  readonly polars: readonly PolarData[];
  readonly polarSetHash: string;
  readonly addedBy: string;
  readonly addedAt: Date;
}

export function presentAirfoilSummary(row: AirfoilRow, ref: PersonRefs): AirfoilSummary {
  return {
    id: row.id,
    name: row.name,
    thicknessPct: row.thicknessPct,
    note: row.note,
    polarSetHash: row.polarSetHash,
    polarCount: row.polars.length,
    reynolds: [...new Set(row.polars.map(({ reynolds }) => reynolds))].sort((a, b) => a - b),
    surfaceStates: [...new Set(row.polars.map(({ surfaceState }) => surfaceState))].sort(),
    addedBy: ref(row.addedBy),
    addedAt: row.addedAt.toISOString(),
  };
}

export function presentAirfoil(row: AirfoilRow, ref: PersonRefs): Airfoil {
  return { ...presentAirfoilSummary(row, ref), outline: row.outline, polars: [...row.polars] };
}
