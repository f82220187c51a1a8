import { z } from 'zod';
import { operation } from '../operation.ts';
import { idValue } from '../values/text.ts';
import { programme } from './programme.ts';

export const getProgramme = operation({
  id: 'programmes.get-programme',
  summary: 'One programme',
  method: 'get',
  path: '/programmes/:programmeId',
  access: 'signed-in',
  status: 200,
  params: z.object({ programmeId: idValue('ProgrammeId') }),
  query: null,
  body: null,
  response: programme,
});
