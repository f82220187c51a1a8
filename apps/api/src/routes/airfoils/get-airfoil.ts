import { getAirfoil } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { getAirfoil as get } from '../../services/airfoils/get-airfoil.ts';

export const getAirfoilRoute = route(getAirfoil, ({ params }) => get(params.airfoilId));
