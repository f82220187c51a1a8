import {
  invitePerson,
  listMembers,
  listPeople,
  removeMember,
  resendInvitation,
  setMember,
  updatePerson,
} from '@tipward/contract';
import { Membership } from '../../src/models/membership.ts';
import { makePerson, someId } from '../factories.ts';
import { row, statuses } from './rights-row.ts';

const administratorOnly = (status: number) => statuses(401, status, 403, 403, 403, 403);

export const peopleRights = [
  row(listPeople, administratorOnly(200)),
  row(invitePerson, administratorOnly(201), () => ({
    body: { email: `invited-${someId()}@example.org`, name: 'Invited' },
  })),
  row(resendInvitation, administratorOnly(204), async ({ api }) => ({
    params: { personId: (await makePerson(api, { withPassword: false })).id },
  })),
  row(updatePerson, administratorOnly(200), async ({ api }) => ({
    params: { personId: (await makePerson(api)).id },
    body: { isAdministrator: true },
  })),
  row(listMembers, statuses(401, 200, 200, 200, 200, 404), ({ programme }) => ({
    params: { programmeId: programme.id },
  })),
  row(setMember, administratorOnly(204), async ({ api, programme }) => ({
    params: { programmeId: programme.id, personId: (await makePerson(api)).id },
    body: { role: 'reader' },
  })),
  row(removeMember, administratorOnly(204), async ({ api, programme }) => {
    const member = await makePerson(api);
    await Membership.create({ programmeId: programme.id, personId: member.id, role: 'reader' });
    return { params: { programmeId: programme.id, personId: member.id } };
  }),
];
