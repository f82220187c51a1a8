import { operation } from '../operation.ts';
import { airfoilSummary } from './airfoil.ts';
import { list } from '../values/page.ts';

export const listAirfoils = operation({
  id: 'airfoils.list-airfoils',
  summary: 'The airfoil library',
  method: 'get',
  path: '/airfoils',
  access: 'signed-in',
  status: 200,
  params: null,
  query: null,
  body: null,
  response: list(airfoilSummary),
});
