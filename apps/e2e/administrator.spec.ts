import { expect, test } from '@playwright/test';
import { openAs } from './people.ts';

test('an administrator invites a person, who takes the invitation up from the mail', async ({ browser }) => {
  const wren = await openAs(browser, 'wren');
  await wren.goto('/people');
  await wren.getByRole('button', { name: /Invite/u }).click();
  const dialog = wren.getByRole('dialog');
  await dialog.getByLabel('E-mail').fill('not an address');
  await dialog.getByRole('button', { name: 'Send the invitation' }).click();
  await expect(dialog.getByText(/E-mail is not an address/u)).toBeVisible();
  await dialog.getByLabel('E-mail').fill('osk@saltmarsh.example');
  await dialog.getByLabel('Name').fill('Osk “the” Ünal 🌬️');
  await dialog.getByLabel('Role in Bittern 3200').selectOption('reader');
  await dialog.getByRole('button', { name: 'Send the invitation' }).click();
  await expect(wren.getByText('Osk “the” Ünal 🌬️')).toBeVisible();

  const link = async () => {
    const { items } = (await (await wren.request.get('/api/v1/dev/mail')).json()) as {
      items: { to: string[]; text: string }[];
    };
    const text = items.find((message) => message.to.includes('osk@saltmarsh.example'))?.text ?? '';
    return /\S+accept-invitation\S+/u.exec(text)?.[0] ?? null;
  };
  await expect.poll(link, { timeout: 30_000 }).not.toBeNull();

  const osk = await (await browser.newContext()).newPage();
  await osk.goto((await link()) ?? '');
  await osk.getByLabel('Name').fill('Osk Ünal');
  await osk.getByLabel('Password').first().fill('a password long enough');
  await osk.getByRole('button', { name: 'Set and sign in' }).click();
  await expect(osk.getByRole('heading', { level: 1, name: 'Programmes' })).toBeVisible();
  await expect(osk.getByRole('link', { name: 'Bittern 3200' })).toBeVisible();
  await expect(osk.getByRole('link', { name: 'Curlew 48' })).toHaveCount(0);
});

test('the audit chain is shown and holds; others do not see it', async ({ browser }) => {
  const wren = await openAs(browser, 'wren');
  await wren.goto('/audit');
  await expect(wren.getByRole('cell', { name: 'releases.made' }).first()).toBeVisible();
  const chain = (await (await wren.request.get('/api/v1/audit/verification')).json()) as {
    holds: boolean;
    events: number;
  };
  expect(chain.holds).toBe(true);
  expect(chain.events).toBeGreaterThan(30);
  const ines = await openAs(browser, 'ines');
  expect((await ines.request.get('/api/v1/audit')).status()).toBe(403);
});
