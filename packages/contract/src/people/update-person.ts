import { z } from 'zod';
import { operation } from '../operation.ts';
import { idValue } from '../values/text.ts';
import { person } from './person.ts';

export const updatePerson = operation({
  id: 'people.update-person',
  summary: 'Make or unmake an administrator, disable or enable',
  method: 'patch',
  path: '/people/:personId',
  access: 'administrator',
  status: 200,
  params: z.object({ personId: idValue('PersonId') }),
  query: null,
  body: z.strictObject({ isAdministrator: z.boolean().optional(), disabled: z.boolean().optional() }),
  response: person,
});
