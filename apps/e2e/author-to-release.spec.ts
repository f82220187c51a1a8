import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { expect, test } from '@playwright/test';
import { strFromU8, unzipSync } from 'fflate';
import { PASSWORDS, listed, openAs, programmeId } from './people.ts';

interface Manifest {
  readonly files: readonly { readonly file: string; readonly bytes: number; readonly sha256: string }[];
}

test('a blade goes from a draft to a release that a reader can prove', async ({ browser }) => {
  test.setTimeout(180_000);
  const marek = await openAs(browser, 'marek');
  const curlew = await programmeId(marek, 'Curlew 48');

  await test.step('the aerodynamicist opens a draft from v5, edits and saves a version', async () => {
    const v5 = (await listed(marek, `/programmes/${curlew}/versions`)).find(
      (version) => version.number === 5,
    );
    await marek.goto(`/versions/${v5?.id ?? ''}`);
    await marek.getByRole('button', { name: 'Open draft from it' }).click();
    await expect(marek).toHaveURL(/\/drafts\//u);
    const cp = marek.locator('tr[data-number]').first().locator('td[data-current="true"]');
    await expect(cp).toHaveText(/^0\.4\d{3}$/u);
    const before = (await cp.textContent()) ?? '';
    const cell = marek.getByRole('gridcell', { name: '0.502' });
    await cell.click();
    await marek.keyboard.type('0.45');
    await marek.keyboard.press('Enter');
    await expect(marek.locator('[data-save="saved"]')).toBeVisible();
    await expect(cp).toHaveText(/^0\.4\d{3}$/u);
    await expect(cp).not.toHaveText(before);
    await marek.getByRole('button', { name: 'Save version' }).click();
    const dialog = marek.getByRole('dialog');
    await dialog.getByLabel('Note').fill('Chord trimmed at mid-span');
    await dialog.getByRole('button', { name: 'Save version' }).click();
    await expect(marek).toHaveURL(/\/versions\//u);
    await expect(marek.getByRole('heading', { name: /What changed since v5/u })).toBeVisible();
  });

  await test.step('and asks for review', async () => {
    await marek.getByRole('button', { name: 'Ask for review' }).click();
    await marek
      .getByRole('dialog')
      .getByLabel(/Message/u)
      .fill('Please look at the middle of the span.');
    await marek.getByRole('dialog').getByRole('button', { name: 'Ask for review' }).click();
    await expect(marek).toHaveURL(/\/reviews\//u);
    await expect(marek.getByRole('button', { name: 'Sign the decision' })).toHaveCount(0);
  });

  const reviewUrl = new URL(marek.url()).pathname;
  const tove = await openAs(browser, 'tove');

  await test.step('the lead comments at a station, is held to her password, approves', async () => {
    await tove.goto(reviewUrl);
    await tove.getByLabel('About', { exact: true }).selectOption({ index: 10 });
    await tove.getByLabel('Comment', { exact: true }).fill('Is this smooth enough for the mould?');
    await tove.getByRole('button', { name: 'Comment', exact: true }).click();
    await expect(tove.getByText('Is this smooth enough for the mould?')).toBeVisible();
    await tove.getByLabel('Your password again').fill('not my password');
    await tove.getByRole('button', { name: 'Sign the decision' }).click();
    await expect(tove.getByText(/Password is wrong/u)).toBeVisible();
    await tove.getByLabel('Your password again').fill(PASSWORDS.tove);
    await tove.getByRole('button', { name: 'Sign the decision' }).click();
    await expect(tove.getByText('Approved', { exact: true })).toBeVisible();
  });

  await test.step('and releases it; the earlier release is superseded', async () => {
    await tove.getByRole('link', { name: 'The version' }).click();
    await tove.getByRole('button', { name: 'Release', exact: true }).click();
    const dialog = tove.getByRole('dialog');
    await dialog.getByRole('button', { name: 'Release', exact: true }).click();
    await expect(dialog.getByText(/Effectivity is empty/u)).toBeVisible();
    await dialog.getByLabel('Effectivity').fill('Turbines C48-020 onward');
    await dialog.getByLabel('Your password again').fill(PASSWORDS.tove);
    await dialog.getByRole('button', { name: 'Release', exact: true }).click();
    await expect(tove.getByRole('heading', { level: 1, name: 'Curlew 48 release B' })).toBeVisible();
  });

  const priya = await openAs(browser, 'priya');
  await test.step('a reader finds it, takes the package and proves every file', async () => {
    await priya.goto(`/programmes/${curlew}`);
    await priya
      .getByRole('link', { name: /release A|\bA\b/u })
      .first()
      .click();
    await expect(priya.getByText('Superseded.')).toBeVisible();
    await priya.getByRole('link', { name: 'go to release B' }).click();
    const downloading = priya.waitForEvent('download');
    await priya.getByRole('button', { name: /Download package/u }).click();
    const bytes = readFileSync(await (await downloading).path());
    await expect(priya.getByText(createHash('sha256').update(bytes).digest('hex'))).toBeVisible();
    const files = unzipSync(bytes);
    const manifest = JSON.parse(strFromU8(files['manifest.json'] ?? new Uint8Array())) as Manifest;
    expect(manifest.files.map((entry) => entry.file)).toEqual([
      'README.txt',
      'stations.csv',
      'curve.csv',
      'schedule.csv',
      'design.json',
      'release.json',
    ]);
    for (const entry of manifest.files)
      expect(
        createHash('sha256')
          .update(files[entry.file] ?? '')
          .digest('hex'),
        entry.file,
      ).toBe(entry.sha256);
    expect(strFromU8(files['README.txt'] ?? new Uint8Array())).toContain('not certified loads');
  });

  await test.step('the mail went to those concerned', async () => {
    const mail = async () => {
      const answer = await priya.request.get('/api/v1/dev/mail');
      const { items } = (await answer.json()) as { items: { to: string[]; subject: string }[] };
      return items.map((message) => `${message.subject} → ${message.to.join()}`);
    };
    await expect.poll(mail, { timeout: 30_000 }).toContain('Release B: Curlew 48 → priya@saltmarsh.example');
    expect(await mail()).toContainEqual(expect.stringMatching(/^Review: .*→ tove@saltmarsh\.example$/u));
    expect(await mail()).toContainEqual(expect.stringMatching(/^Approved: .*→ marek@saltmarsh\.example$/u));
  });
});
