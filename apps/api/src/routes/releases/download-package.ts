import { downloadPackage } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { downloadPackage as serve } from '../../services/releases/download-package.ts';

export const downloadPackageRoute = route(downloadPackage, ({ context, actor, params }) =>
  serve(context, actor, params.releaseId),
);
