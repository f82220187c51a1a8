import type { AirfoilSummary } from '@tipward/contract';
import { AirfoilRecord } from '../../models/airfoil-record.ts';
import { presentAirfoilSummary } from '../../presenters/airfoil.ts';
import { loadPersonRefs } from '../people/load-person-refs.ts';

/** The library, thinnest first. */
export async function listAirfoils(): Promise<{ items: AirfoilSummary[] }> {
  const rows = await AirfoilRecord.findAll({ order: ['thicknessPct', 'name'] });
  const ref = await loadPersonRefs(rows.map(({ addedBy }) => addedBy));
  return { items: rows.map((row) => presentAirfoilSummary(row, ref)) };
}
