import { addAirfoilRoute } from './add-airfoil.ts';
import { getAirfoilRoute } from './get-airfoil.ts';
import { listAirfoilsRoute } from './list-airfoils.ts';

export const airfoilRoutes = [listAirfoilsRoute, getAirfoilRoute, addAirfoilRoute];
