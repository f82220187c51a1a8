import { createProgramme } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { createProgramme as create } from '../../services/programmes/create-programme.ts';

export const createProgrammeRoute = route(createProgramme, async ({ context, actor, body, setETag }) => {
  const { view, etag } = await create(context, actor, body);
  setETag(etag);
  return view;
});
