import { saveVersion } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { saveVersion as serve } from '../../services/versions/save-version.ts';

export const saveVersionRoute = route(saveVersion, ({ context, actor, params, body, ifMatch }) =>
  serve(context, actor, params.draftId, body.note, ifMatch),
);
