import { getProgramme } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { getProgramme as get } from '../../services/programmes/get-programme.ts';

export const getProgrammeRoute = route(getProgramme, async ({ context, actor, params, setETag }) => {
  const { view, etag } = await get(context, actor, params.programmeId);
  setETag(etag);
  return view;
});
