import { listSpecifications } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { listSpecifications as list } from '../../services/programmes/list-specifications.ts';

export const listSpecificationsRoute = route(listSpecifications, ({ actor, params }) =>
  list(actor, params.programmeId),
);
