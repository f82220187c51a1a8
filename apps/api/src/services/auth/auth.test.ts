import request from 'supertest';
import { beforeEach, describe, expect, it } from 'vitest';
import { makePerson, PASSWORD } from '../../../test/factories.ts';
import { makeLinkToken, tokenOfLink } from '../../../test/links.ts';
import { callAs, nobody } from '../../../test/sign-in.ts';
import { PUBLIC_URL, useTestApi } from '../../../test/test-api.ts';
import { AuditEventRecord } from '../../models/audit-event-record.ts';
import { OneTimeLink } from '../../models/one-time-link.ts';
import { OutboxMail } from '../../models/outbox-mail.ts';
import type { Person } from '../../models/person.ts';
import { RefreshSession } from '../../models/refresh-session.ts';
import { signAccessToken } from './access-token.ts';

const api = useTestApi({ signInFailuresAllowed: 5 });
const NEW_PASSWORD = 'quite another password';

interface Browser {
  cookies: Map<string, string>;
  csrf: string | null;
}
const browser = (): Browser => ({ cookies: new Map(), csrf: null });
const jar = ({ cookies }: Browser) => [...cookies].map(([name, value]) => `${name}=${value}`).join('; ');

/** Sends as a browser would: keeps the cookies of the answer and its CSRF token. */
async function send(from: Browser, method: 'get' | 'post', path: string, body?: object) {
  const agent = request(api().app);
  const test = agent[method](`/api/v1${path}`).set('Cookie', jar(from)).set('Origin', PUBLIC_URL);
  if (from.csrf !== null) test.set('X-CSRF-Token', from.csrf);
  const answer = await test.send(body);
  for (const line of (answer.headers['set-cookie'] as unknown as string[] | undefined) ?? []) {
    const [, name = '', value = ''] = /^([^=]+)=([^;]*)/u.exec(line) ?? [];
    if (value === '') from.cookies.delete(name);
    else from.cookies.set(name, value);
  }
  if (typeof answer.body?.csrfToken === 'string') from.csrf = answer.body.csrfToken;
  return answer;
}
const signIn = (from: Browser, person: Person, password = PASSWORD) =>
  send(from, 'post', '/auth/sign-in', { email: person.email, password });
const ageTokens = (seconds: number) =>
  api().context.db.query(`UPDATE refresh_sessions SET used_at = used_at - interval '${seconds} seconds'`);

let person: Person;
beforeEach(async () => {
  person = await makePerson(api());
});

describe('signing in', () => {
  it('sets guarded cookies and answers who it is', async () => {
    const from = browser();
    const { status, body, headers } = await signIn(from, person);
    expect(status).toBe(200);
    expect(body).toMatchObject({ person: { id: person.id, status: 'active' }, canCreateProgramme: false });
    const lines = headers['set-cookie'] as unknown as string[];
    expect(lines).toHaveLength(2);
    for (const line of lines) expect(line).toMatch(/HttpOnly; SameSite=Strict/u);
    expect(lines.find((line) => line.startsWith('tipward_session='))).toMatch(/Max-Age=600; Path=\/;/u);
    expect(lines.find((line) => line.startsWith('tipward_refresh='))).toMatch(/Path=\/api\/v1\/auth;/u);
    expect((await send(from, 'get', '/auth/session')).body.person.id).toBe(person.id);
    expect((await send(from, 'get', '/programmes')).status).toBe(200);
  });

  it('answers alike to an unknown address, a wrong password and a closed account', async () => {
    const closed = await makePerson(api());
    await closed.update({ disabledAt: new Date() });
    const answers = [
      await send(browser(), 'post', '/auth/sign-in', { email: 'no-one@example.org', password: PASSWORD }),
      await signIn(browser(), person, 'a wrong password'),
      await signIn(browser(), closed),
    ];
    for (const { status, body, headers } of answers) {
      expect(status).toBe(401);
      expect(body).toEqual(answers[0]?.body);
      expect(headers['set-cookie']).toBeUndefined();
    }
  });

  it('reads the address without regard to case and spaces', async () => {
    const answer = await send(browser(), 'post', '/auth/sign-in', {
      email: `  ${person.email.toUpperCase()} `,
      password: PASSWORD,
    });
    expect(answer.status).toBe(200);
  });

  it('names all that is wrong and never echoes a password', async () => {
    const { status, body } = await send(browser(), 'post', '/auth/sign-in', {
      email: 'x',
      password: '',
      more: 1,
    });
    expect(status).toBe(422);
    expect(body.faults.map(({ field }: { field: string }) => field).toSorted()).toEqual([
      'email',
      'more',
      'password',
    ]);
    expect(body.faults.find(({ field }: { field: string }) => field === 'password').value).toBe('hidden');
  });

  it('stops after too many failures for one account, and lets others in', async () => {
    for (let i = 0; i < 5; i += 1) expect((await signIn(browser(), person, 'wrong wrong')).status).toBe(401);
    const { status, body, headers } = await signIn(browser(), person);
    expect(status).toBe(429);
    expect(body.code).toBe('too-many-requests');
    expect(Number(headers['retry-after'])).toBeGreaterThan(0);
    expect((await signIn(browser(), await makePerson(api()))).status).toBe(200);
  });

  it('does not count successes', async () => {
    for (let i = 0; i < 8; i += 1) expect((await signIn(browser(), person)).status).toBe(200);
  });

  it('refuses a page of another site', async () => {
    const answer = await request(api().app)
      .post('/api/v1/auth/sign-in')
      .set('Origin', 'https://elsewhere.example')
      .send({ email: person.email, password: PASSWORD });
    expect(answer.status).toBe(403);
  });
});

describe('a session', () => {
  it('is nobody without cookies, and asks for a refresh when only the refresh cookie is left', async () => {
    const nobodySession = await nobody(api()).get('/auth/session');
    expect(nobodySession.body).toMatchObject({ person: null, csrfToken: null });
    const from = browser();
    await signIn(from, person);
    from.cookies.delete('tipward_session');
    expect((await send(from, 'get', '/auth/session')).status).toBe(401);
    expect((await send(from, 'post', '/auth/refresh')).status).toBe(200);
    expect((await send(from, 'get', '/auth/session')).body.person.id).toBe(person.id);
  });

  it('takes no token signed with another secret, altered, or of another kind', async () => {
    const from = browser();
    await signIn(from, person);
    const token = from.cookies.get('tipward_session') ?? '';
    const [header = '', payload = '', signature = ''] = token.split('.');
    const claims = JSON.parse(Buffer.from(payload, 'base64url').toString()) as { fam: string };
    const otherContext = { ...api().context, config: { ...api().context.config, secret: 'x'.repeat(40) } };
    const none = Buffer.from('{"alg":"none","typ":"JWT"}').toString('base64url');
    const altered = Buffer.from(JSON.stringify({ ...claims, exp: 9_999_999_999 })).toString('base64url');
    for (const forged of [
      signAccessToken(otherContext, { personId: person.id, familyId: claims.fam }),
      `${header}.${altered}.${signature}`,
      `${none}.${payload}.`,
      from.cookies.get('tipward_refresh') ?? '',
      'nonsense',
    ]) {
      from.cookies.set('tipward_session', forged);
      expect((await send(from, 'get', '/programmes')).status).toBe(401);
    }
  });

  it('ends at once for someone whose account is closed, and their refresh too', async () => {
    const from = browser();
    await signIn(from, person);
    const administrator = await callAs(api(), await makePerson(api(), { isAdministrator: true }));
    expect((await administrator.patch(`/people/${person.id}`, { disabled: true })).body.status).toBe(
      'disabled',
    );
    expect((await send(from, 'get', '/programmes')).status).toBe(401);
    expect((await send(from, 'post', '/auth/refresh')).status).toBe(401);
    expect((await administrator.patch(`/people/${person.id}`, { disabled: false })).body.status).toBe(
      'active',
    );
    expect((await send(from, 'get', '/programmes')).status).toBe(401);
    expect((await signIn(browser(), person)).status).toBe(200);
  });
});

describe('refreshing', () => {
  it('rotates the token and keeps the CSRF token', async () => {
    const from = browser();
    await signIn(from, person);
    const before = { refresh: from.cookies.get('tipward_refresh'), csrf: from.csrf };
    expect((await send(from, 'post', '/auth/refresh')).status).toBe(200);
    expect(from.cookies.get('tipward_refresh')).not.toBe(before.refresh);
    expect(from.csrf).toBe(before.csrf);
  });

  it('gives two tabs that refresh at once the same successor', async () => {
    const from = browser();
    await signIn(from, person);
    const tabs = [1, 2, 3].map((): Browser => ({ cookies: new Map(from.cookies), csrf: from.csrf }));
    const answers = await Promise.all(tabs.map((tab) => send(tab, 'post', '/auth/refresh')));
    expect(answers.map(({ status }) => status)).toEqual([200, 200, 200]);
    const tokens = new Set(tabs.map(({ cookies }) => cookies.get('tipward_refresh')));
    expect(tokens.size).toBe(1);
    for (const tab of tabs) expect((await send(tab, 'get', '/programmes')).status).toBe(200);
  });

  it('ends the whole family when a token is used again later', async () => {
    const from = browser();
    await signIn(from, person);
    const stolen: Browser = { cookies: new Map(from.cookies), csrf: from.csrf };
    await send(from, 'post', '/auth/refresh');
    await ageTokens(11);
    const answer = await send(stolen, 'post', '/auth/refresh');
    expect(answer.status).toBe(401);
    expect(stolen.cookies.size).toBe(0);
    expect((await send(from, 'get', '/programmes')).status).toBe(401);
    expect((await send(from, 'post', '/auth/refresh')).status).toBe(401);
    const noted = await AuditEventRecord.count({
      where: { action: 'auth.refresh-token-reused', subjectId: person.id },
    });
    expect(noted).toBe(1);
  });

  it('leaves the other sessions of the person alone when one family ends', async () => {
    const [one, two] = [browser(), browser()];
    await signIn(one, person);
    await signIn(two, person);
    await send(one, 'post', '/auth/sign-out');
    expect(one.cookies.size).toBe(0);
    expect((await send(two, 'post', '/auth/refresh')).status).toBe(200);
  });

  it('keeps no token in the clear', async () => {
    const from = browser();
    await signIn(from, person);
    const stored = (await RefreshSession.findAll()).map(({ tokenHash }) => tokenHash);
    expect(stored).not.toContain(from.cookies.get('tipward_refresh'));
    expect(stored.every((hash) => /^[0-9a-f]{64}$/u.test(hash))).toBe(true);
  });

  it('refuses an expired token', async () => {
    const from = browser();
    await signIn(from, person);
    await api().context.db.query(`UPDATE refresh_sessions SET expires_at = now() - interval '1 second'`);
    expect((await send(from, 'post', '/auth/refresh')).status).toBe(401);
  });
});

it('signs out everywhere', async () => {
  const [one, two] = [browser(), browser()];
  await signIn(one, person);
  await signIn(two, person);
  expect((await send(one, 'post', '/auth/sign-out-everywhere')).status).toBe(204);
  for (const each of [one, two]) expect((await send(each, 'get', '/programmes')).status).toBe(401);
  expect((await send(two, 'post', '/auth/refresh')).status).toBe(401);
});

describe('changing the password', () => {
  it('needs the current one, ends the other sessions and keeps this one', async () => {
    const [here, there] = [browser(), browser()];
    await signIn(here, person);
    await signIn(there, person);
    const change = (currentPassword: string) =>
      send(here, 'post', '/auth/change-password', { currentPassword, newPassword: NEW_PASSWORD });
    const wrong = await change('not the password');
    expect(wrong.status).toBe(422);
    expect(wrong.body.faults[0]).toMatchObject({ field: 'currentPassword', value: 'hidden' });
    expect((await change(PASSWORD)).status).toBe(204);
    expect((await send(here, 'get', '/programmes')).status).toBe(200);
    expect((await send(there, 'get', '/programmes')).status).toBe(401);
    expect((await signIn(browser(), person)).status).toBe(401);
    expect((await signIn(browser(), person, NEW_PASSWORD)).status).toBe(200);
  });

  it('stops after too many wrong ones', async () => {
    const from = browser();
    await signIn(from, person);
    const change = (currentPassword: string) =>
      send(from, 'post', '/auth/change-password', { currentPassword, newPassword: NEW_PASSWORD });
    for (let i = 0; i < 5; i += 1) expect((await change('wrong wrong')).status).toBe(422);
    expect((await change(PASSWORD)).status).toBe(429);
  });

  it.each([
    ['too short', 'short'],
    ['over 72 bytes', 'é'.repeat(37)],
  ])('refuses a password that is %s', async (_what, newPassword) => {
    const caller = await callAs(api(), person);
    const { status, body } = await caller.post('/auth/change-password', {
      currentPassword: PASSWORD,
      newPassword,
    });
    expect(status).toBe(422);
    expect(body.faults).toHaveLength(1);
    expect(body.faults[0]).toMatchObject({ field: 'newPassword', value: 'hidden' });
  });
});

describe('resetting the password', () => {
  const ask = (email: string) => nobody(api()).post('/auth/request-password-reset', { email });
  const reset = (token: string) =>
    nobody(api()).post('/auth/reset-password', { token, password: NEW_PASSWORD });

  it('mails a link that works once and ends every session', async () => {
    const from = browser();
    await signIn(from, person);
    expect((await ask(person.email)).status).toBe(202);
    const mail = await OutboxMail.findOne({ where: { toAddress: person.email }, rejectOnEmpty: true });
    expect(mail.text).toContain(`${PUBLIC_URL}/reset-password#token=`);
    const token = tokenOfLink(mail.text);
    expect((await OneTimeLink.findAll()).map(({ tokenHash }) => tokenHash)).not.toContain(token);
    expect((await reset(token)).status).toBe(204);
    expect((await send(from, 'get', '/programmes')).status).toBe(401);
    expect((await signIn(browser(), person, NEW_PASSWORD)).status).toBe(200);
    const again = await reset(token);
    expect(again.status).toBe(422);
    expect(again.body.faults[0].field).toBe('token');
  });

  it('says the same, and as late, to an address it does not know', async () => {
    const before = await OutboxMail.count();
    const started = performance.now();
    const unknown = await ask('no-one-here@example.org');
    expect(performance.now() - started).toBeGreaterThan(240);
    const known = await ask(person.email);
    expect([unknown.status, unknown.text]).toEqual([known.status, known.text]);
    expect(await OutboxMail.count()).toBe(before + 1);
  });

  it('mails nothing to someone invited or disabled', async () => {
    const invited = await makePerson(api(), { withPassword: false });
    const closed = await makePerson(api());
    await closed.update({ disabledAt: new Date() });
    for (const { email } of [invited, closed]) {
      expect((await ask(email)).status).toBe(202);
      expect(await OutboxMail.count({ where: { toAddress: email } })).toBe(0);
    }
  });

  it('refuses an expired link, the link of another purpose, and an earlier link', async () => {
    const expired = await makeLinkToken(api(), person, 'password-reset');
    await OneTimeLink.update({ expiresAt: new Date(Date.now() - 1) }, { where: { personId: person.id } });
    const invitation = await makeLinkToken(api(), person, 'invitation');
    const earlier = await makeLinkToken(api(), person, 'password-reset');
    const latest = await makeLinkToken(api(), person, 'password-reset');
    for (const token of [expired, invitation, earlier, 'x'.repeat(43)])
      expect((await reset(token)).status).toBe(422);
    expect((await reset(latest)).status).toBe(204);
  });

  it('lets a link through once when it is used twice at the same moment', async () => {
    const token = await makeLinkToken(api(), person, 'password-reset');
    const answers = await Promise.all([reset(token), reset(token), reset(token)]);
    expect(answers.map(({ status }) => status).toSorted()).toEqual([204, 422, 422]);
  });

  it('is limited for one address', async () => {
    for (let i = 0; i < 5; i += 1) expect((await ask('flooded@example.org')).status).toBe(202);
    expect((await ask('flooded@example.org')).status).toBe(429);
  });
});
