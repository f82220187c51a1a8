import { operation } from '../operation.ts';
import { person } from './person.ts';
import { list } from '../values/page.ts';

export const listPeople = operation({
  id: 'people.list-people',
  summary: 'All people',
  method: 'get',
  path: '/people',
  access: 'administrator',
  status: 200,
  params: null,
  query: null,
  body: null,
  response: list(person),
});
