import { operation } from '../operation.ts';
import { airfoil, airfoilInput } from './airfoil.ts';

export const addAirfoil = operation({
  id: 'airfoils.add-airfoil',
  summary: 'Add an airfoil with its polars; it never changes afterwards',
  method: 'post',
  path: '/airfoils',
  access: 'signed-in',
  status: 201,
  params: null,
  query: null,
  body: airfoilInput,
  response: airfoil,
  idempotent: true,
});
