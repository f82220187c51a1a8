import type { Airfoil } from '@tipward/contract';
import { notFound } from '../../http/app-error.ts';
import { AirfoilRecord } from '../../models/airfoil-record.ts';
import { presentAirfoil } from '../../presenters/airfoil.ts';
import { loadPersonRefs } from '../people/load-person-refs.ts';

export async function getAirfoil(airfoilId: string): Promise<Airfoil> {
  const row = await AirfoilRecord.findByPk(airfoilId);
  if (row === null) throw notFound('This airfoil');
  return presentAirfoil(row, await loadPersonRefs([row.addedBy]));
}
