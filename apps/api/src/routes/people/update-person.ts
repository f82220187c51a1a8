import { updatePerson } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { updatePerson as update } from '../../services/people/update-person.ts';

export const updatePersonRoute = route(updatePerson, ({ context, actor, params, body }) =>
  update(context, actor, params.personId, body),
);
