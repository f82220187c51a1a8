import { z } from 'zod';
import { operation } from '../operation.ts';
import { person, role } from './person.ts';
import { emailAddress, idValue, nameText } from '../values/text.ts';

export const invitePerson = operation({
  id: 'people.invite-person',
  summary: 'Invite a person by e-mail',
  method: 'post',
  path: '/people/invitations',
  access: 'administrator',
  status: 201,
  params: null,
  query: null,
  body: z.strictObject({
    email: emailAddress,
    name: nameText('Name'),
    isAdministrator: z.boolean().default(false),
    memberships: z
      .array(z.strictObject({ programmeId: idValue('Programme'), role }))
      .max(50, 'allowed: at most 50 memberships')
      .default([]),
  }),
  response: person,
  idempotent: true,
});
