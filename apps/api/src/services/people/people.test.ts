import { beforeAll, describe, expect, it } from 'vitest';
import { makePerson, makeProgramme, PASSWORD, someId } from '../../../test/factories.ts';
import { tokenOfLink } from '../../../test/links.ts';
import { callAs, nobody } from '../../../test/sign-in.ts';
import { useTestApi } from '../../../test/test-api.ts';
import { AuditEventRecord } from '../../models/audit-event-record.ts';
import { OutboxMail } from '../../models/outbox-mail.ts';
import { Person } from '../../models/person.ts';
import type { Programme } from '../../models/programme.ts';

const api = useTestApi();
let administrator: Awaited<ReturnType<typeof callAs>>;
let root: Person;
let programme: Programme;
beforeAll(async () => {
  root = await makePerson(api(), { isAdministrator: true, name: 'Root' });
  administrator = await callAs(api(), root);
  programme = await makeProgramme(root, [], 'Curlew');
});
const mailTo = (email: string) => OutboxMail.findAll({ where: { toAddress: email }, order: ['createdAt'] });

describe('an invitation', () => {
  it('arrives by mail, sets name and password and signs in with the roles given', async () => {
    const email = 'newcomer@example.org';
    const invited = await administrator.post('/people/invitations', {
      email: ' Newcomer@Example.ORG ',
      name: 'New Comer',
      memberships: [{ programmeId: programme.id, role: 'lead' }],
    });
    expect(invited.status).toBe(201);
    expect(invited.body).toMatchObject({ email, status: 'invited', isAdministrator: false });
    const [mail] = await mailTo(email);
    expect(mail?.text).toContain('lead in Curlew');
    const token = tokenOfLink(mail?.text ?? '');
    const accept = () =>
      nobody(api()).post('/auth/accept-invitation', { token, name: 'Now Comer', password: PASSWORD });
    const accepted = await accept();
    expect(accepted.status).toBe(200);
    expect(accepted.body).toMatchObject({
      canCreateProgramme: true,
      person: {
        name: 'Now Comer',
        status: 'active',
        memberships: [{ programmeId: programme.id, programmeName: 'Curlew', role: 'lead' }],
      },
    });
    expect(accepted.headers['set-cookie']).toHaveLength(2);
    expect((await accept()).status).toBe(422);
    expect((await administrator.post(`/people/${accepted.body.person.id}/invitation`)).status).toBe(409);
  });

  it('sent again ends the earlier link', async () => {
    const { body } = await administrator.post('/people/invitations', {
      email: 'late@example.org',
      name: 'Late',
    });
    expect((await administrator.post(`/people/${body.id}/invitation`)).status).toBe(204);
    const [first, second] = (await mailTo('late@example.org')).map(({ text }) => tokenOfLink(text));
    const accept = (token = '') =>
      nobody(api()).post('/auth/accept-invitation', { token, name: 'Late', password: PASSWORD });
    expect((await accept(first)).status).toBe(422);
    expect((await accept(second)).status).toBe(200);
  });

  it('is refused for an address that is here, and saves nothing when a programme is unknown', async () => {
    const given = { email: root.email, name: 'Twice' };
    expect((await administrator.post('/people/invitations', given)).status).toBe(409);
    const { status, body } = await administrator.post('/people/invitations', {
      email: 'half@example.org',
      name: 'Half',
      memberships: [
        { programmeId: programme.id, role: 'reader' },
        { programmeId: someId(), role: 'reader' },
        { programmeId: programme.id, role: 'lead' },
      ],
    });
    expect(status).toBe(422);
    expect(body.faults.map(({ field }: { field: string }) => field)).toEqual([
      'memberships[1].programmeId',
      'memberships[2].programmeId',
    ]);
    expect(await Person.count({ where: { email: 'half@example.org' } })).toBe(0);
    expect(await mailTo('half@example.org')).toHaveLength(0);
  });

  it('with the same Idempotency-Key is sent once', async () => {
    const key = `invite-${someId()}`;
    const send = (name: string) =>
      administrator
        .post('/people/invitations', { email: 'once@example.org', name })
        .set('Idempotency-Key', key);
    const first = await send('Once');
    const second = await send('Once');
    expect([first.status, second.status]).toEqual([201, 201]);
    expect(second.body).toEqual(first.body);
    expect(await mailTo('once@example.org')).toHaveLength(1);
    const other = await send('Someone else');
    expect(other.status).toBe(409);
    expect(other.body.detail).toContain('another request');
  });
});

describe('roles', () => {
  it('are given, changed, taken, and hold at once', async () => {
    const person = await makePerson(api());
    const caller = await callAs(api(), person);
    const at = `/programmes/${programme.id}/members/${person.id}`;
    expect((await caller.get(`/programmes/${programme.id}`)).status).toBe(404);
    expect((await administrator.put(at, { role: 'reader' })).status).toBe(204);
    expect((await caller.get(`/programmes/${programme.id}`)).body.role).toBe('reader');
    expect((await administrator.put(at, { role: 'lead' })).status).toBe(204);
    expect((await caller.get(`/programmes/${programme.id}`)).body.abilities.edit).toBe(true);
    expect((await administrator.delete(at)).status).toBe(204);
    expect((await caller.get(`/programmes/${programme.id}`)).status).toBe(404);
    expect((await administrator.delete(at)).status).toBe(404);
    const actions = await AuditEventRecord.findAll({ where: { subjectId: person.id }, order: ['sequence'] });
    expect(actions.map(({ action }) => action)).toEqual([
      'people.role-given',
      'people.role-given',
      'people.role-taken',
    ]);
    expect(actions[1]?.detail).toEqual({ role: 'lead', before: 'reader' });
  });

  it('refuses an unknown role, person or programme', async () => {
    const at = (programmeId: string, personId: string) => `/programmes/${programmeId}/members/${personId}`;
    const wrong = await administrator.put(at(programme.id, root.id), { role: 'owner' });
    expect(wrong.body.faults[0]).toMatchObject({ field: 'role', value: '"owner"' });
    expect((await administrator.put(at(programme.id, someId()), { role: 'lead' })).status).toBe(404);
    expect((await administrator.put(at(someId(), root.id), { role: 'lead' })).status).toBe(404);
    expect((await administrator.put(at('nonsense', root.id), { role: 'lead' })).status).toBe(404);
  });
});

it('keeps at least one administrator', async () => {
  expect((await administrator.patch(`/people/${root.id}`, { isAdministrator: false })).status).toBe(409);
  expect((await administrator.patch(`/people/${root.id}`, { disabled: true })).status).toBe(409);
  const second = await makePerson(api());
  await administrator.patch(`/people/${second.id}`, { isAdministrator: true });
  const demoted = await administrator.patch(`/people/${second.id}`, { isAdministrator: false });
  expect(demoted.body.isAdministrator).toBe(false);
});
