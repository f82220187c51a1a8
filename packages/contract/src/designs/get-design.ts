import { z } from 'zod';
import { operation } from '../operation.ts';
import { idValue } from '../values/text.ts';
import { design } from './design.ts';

export const getDesign = operation({
  id: 'designs.get-design',
  summary: 'One design with its versions and the caller’s drafts',
  method: 'get',
  path: '/designs/:designId',
  access: 'signed-in',
  status: 200,
  params: z.object({ designId: idValue('DesignId') }),
  query: null,
  body: null,
  response: design,
});
