import { z } from 'zod';
import { operation } from '../operation.ts';
import { programme } from './programme.ts';
import { idValue, nameText, optionalProse } from '../values/text.ts';

export const updateProgramme = operation({
  id: 'programmes.update-programme',
  summary: 'Rename or describe a programme',
  method: 'patch',
  path: '/programmes/:programmeId',
  access: 'signed-in',
  status: 200,
  params: z.object({ programmeId: idValue('ProgrammeId') }),
  query: null,
  body: z.strictObject({ name: nameText('Programme name'), summary: optionalProse('Summary', 500) }),
  response: programme,
  ifMatch: true,
});
