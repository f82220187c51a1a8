import { renameDesign } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { renameDesign as serve } from '../../services/designs/rename-design.ts';

export const renameDesignRoute = route(
  renameDesign,
  async ({ context, actor, params, body, ifMatch, setETag }) => {
    const { view, etag } = await serve(context, actor, params.designId, body.name, ifMatch);
    setETag(etag);
    return view;
  },
);
