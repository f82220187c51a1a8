import { listMembers } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { listMembers as list } from '../../services/people/list-members.ts';

export const listMembersRoute = route(listMembers, ({ actor, params }) => list(actor, params.programmeId));
