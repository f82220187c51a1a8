import { addAirfoil } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { addAirfoil as add } from '../../services/airfoils/add-airfoil.ts';

export const addAirfoilRoute = route(addAirfoil, ({ context, actor, body }) => add(context, actor, body));
