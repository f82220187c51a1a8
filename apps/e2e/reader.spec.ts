import { expect, test } from '@playwright/test';
import { listed, openAs, programmeId } from './people.ts';

test('a reader sees releases only, in pages and through the API', async ({ browser }) => {
  const ines = await openAs(browser, 'ines');
  const curlew = await programmeId(ines, 'Curlew 48');
  const versions = await listed(ines, `/programmes/${curlew}/versions`);
  const reviews = await listed(ines, '/reviews');
  const drafts = await listed(ines, '/drafts');
  const ids = { version: versions[0]?.id ?? '', review: reviews[0]?.id ?? '', draft: drafts[0]?.id ?? '' };

  const priya = await openAs(browser, 'priya');
  for (const path of [
    `/versions/${ids.version}`,
    `/reviews/${ids.review}`,
    `/drafts/${ids.draft}`,
    `/programmes/${curlew}/versions`,
    `/programmes/${curlew}/designs`,
  ]) {
    const answer = await priya.request.get(`/api/v1${path}`);
    expect(answer.status(), path).toBe(404);
    expect(answer.headers()['content-type']).toContain('application/problem+json');
  }
  for (const path of [`/versions/${ids.version}`, `/reviews/${ids.review}`, `/drafts/${ids.draft}`]) {
    await priya.goto(path);
    await expect(priya.getByRole('main')).toContainText(/Could not find/u);
  }
  await priya.goto(`/programmes/${curlew}`);
  await expect(priya.getByRole('heading', { level: 1, name: 'Curlew 48' })).toBeVisible();
  await expect(priya.getByText('New design')).toHaveCount(0);
  expect(await listed(priya, '/reviews')).toHaveLength(0);
});

test('nobody is let in without signing in', async ({ page, request }) => {
  await page.goto('/');
  await expect(page.getByRole('heading', { level: 1, name: 'Sign in' })).toBeVisible();
  expect((await request.get('/api/v1/programmes')).status()).toBe(401);
  await page.getByLabel('E-mail').fill('ines@saltmarsh.example');
  await page.getByLabel('Password').fill('wrong password');
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByText(/E-mail or password is wrong/u)).toBeVisible();
});
