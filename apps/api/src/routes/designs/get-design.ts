import { getDesign } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { getDesign as serve } from '../../services/designs/get-design.ts';

export const getDesignRoute = route(getDesign, async ({ actor, params, setETag }) => {
  const { view, etag } = await serve(actor, params.designId);
  setETag(etag);
  return view;
});
