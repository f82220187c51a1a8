import { updateProgramme } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { updateProgramme as update } from '../../services/programmes/update-programme.ts';

export const updateProgrammeRoute = route(
  updateProgramme,
  async ({ context, actor, params, body, ifMatch, setETag }) => {
    const { view, etag } = await update(context, actor, params.programmeId, body, ifMatch);
    setETag(etag);
    return view;
  },
);
