import { addAirfoil, getAirfoil, listAirfoils } from '@tipward/contract';
import { airfoilInput, makeAirfoil, someId } from '../factories.ts';
import { row, statuses } from './rights-row.ts';

const signedIn = statuses(401, 200, 200, 200, 200, 200);

export const airfoilRights = [
  row(listAirfoils, signedIn),
  row(getAirfoil, signedIn, async ({ people }) => ({
    params: { airfoilId: (await makeAirfoil(people.lead)).id },
  })),
  row(addAirfoil, statuses(401, 403, 201, 201, 403, 403), () => ({
    body: airfoilInput(`F ${someId()}`.slice(0, 40)),
  })),
];
