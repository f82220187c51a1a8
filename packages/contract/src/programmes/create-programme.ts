import { z } from 'zod';
import { operation } from '../operation.ts';
import { programme } from './programme.ts';
import { requirements, specification } from './specification.ts';
import { nameText, optionalProse } from '../values/text.ts';

export const createProgramme = operation({
  id: 'programmes.create-programme',
  summary: 'Create a programme with issue 1 of its specification; the caller becomes its lead',
  method: 'post',
  path: '/programmes',
  access: 'signed-in',
  status: 201,
  params: null,
  query: null,
  body: z.strictObject({
    name: nameText('Programme name'),
    summary: optionalProse('Summary', 500),
    specification,
    requirements,
  }),
  response: programme,
  idempotent: true,
});
