import { listPeople } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { listPeople as list } from '../../services/people/list-people.ts';

export const listPeopleRoute = route(listPeople, () => list());
