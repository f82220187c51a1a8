import { listProgrammes } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { listProgrammes as list } from '../../services/programmes/list-programmes.ts';

export const listProgrammesRoute = route(listProgrammes, ({ context, actor }) => list(context, actor));
