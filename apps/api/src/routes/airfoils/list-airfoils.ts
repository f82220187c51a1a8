import { listAirfoils } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { listAirfoils as list } from '../../services/airfoils/list-airfoils.ts';

export const listAirfoilsRoute = route(listAirfoils, () => list());
