import { z } from 'zod';
import { operation } from '../operation.ts';
import { idValue } from '../values/text.ts';
import { airfoil } from './airfoil.ts';

export const getAirfoil = operation({
  id: 'airfoils.get-airfoil',
  summary: 'One airfoil with outline and polars',
  method: 'get',
  path: '/airfoils/:airfoilId',
  access: 'signed-in',
  status: 200,
  params: z.object({ airfoilId: idValue('AirfoilId') }),
  query: null,
  body: null,
  response: airfoil,
});
