import { z } from 'zod';
import { operation } from '../operation.ts';
import { design } from './design.ts';
import { idValue, nameText } from '../values/text.ts';

export const renameDesign = operation({
  id: 'designs.rename-design',
  summary: 'Rename a design',
  method: 'patch',
  path: '/designs/:designId',
  access: 'signed-in',
  status: 200,
  params: z.object({ designId: idValue('DesignId') }),
  query: null,
  body: z.strictObject({ name: nameText('Design name') }),
  response: design,
  ifMatch: true,
});
