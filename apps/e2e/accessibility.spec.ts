import { AxeBuilder } from '@axe-core/playwright';
import type { Browser, Page } from '@playwright/test';
import { expect, test } from '@playwright/test';
import type { Who } from './people.ts';
import { listed, programmeId, signIn } from './people.ts';

type Theme = 'light' | 'dark';

async function open(browser: Browser, who: Who, colorScheme: Theme): Promise<Page> {
  const context = await browser.newContext({ colorScheme, reducedMotion: 'reduce' });
  const page = await context.newPage();
  await signIn(page, who);
  return page;
}

async function check(page: Page, path: string): Promise<void> {
  await page.goto(path);
  await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
  await page.waitForLoadState('networkidle');
  const { violations } = await new AxeBuilder({ page })
    .withTags(['wcag2a', 'wcag2aa', 'wcag21aa', 'wcag22aa'])
    .analyze();
  const found = violations.flatMap((v) =>
    v.nodes.map((node) => `${path}: ${v.id} at ${node.target.join(' ')}`),
  );
  expect(found).toEqual([]);
}

/** Every route a person who does the work can reach. */
async function workPaths(page: Page): Promise<string[]> {
  const curlew = await programmeId(page, 'Curlew 48');
  const [versions, reviews, drafts, airfoils, releases, designs] = await Promise.all([
    listed(page, `/programmes/${curlew}/versions`),
    listed(page, '/reviews'),
    listed(page, '/drafts'),
    listed(page, '/airfoils'),
    listed(page, `/programmes/${curlew}/releases`),
    listed(page, `/programmes/${curlew}/designs`),
  ]);
  const first = (items: readonly { id: string }[]) => items[0]?.id ?? 'none';
  return [
    '/',
    `/programmes/${curlew}`,
    `/programmes/${curlew}/specification`,
    `/programmes/${curlew}/designs/new`,
    `/designs/${first(designs)}`,
    `/versions/${first(versions)}`,
    `/compare?v=${versions[1]?.id ?? ''}&v=${first(versions)}`,
    `/reviews/${first(reviews)}`,
    `/releases/${first(releases)}`,
    `/drafts/${first(drafts)}`,
    '/airfoils',
    `/airfoils/${first(airfoils)}`,
    '/account',
    '/dev/mail',
    '/no-such-page',
  ];
}

for (const theme of ['light', 'dark'] as const) {
  test(`axe finds nothing on the routes of the work, ${theme}`, async ({ browser }) => {
    test.setTimeout(240_000);
    const page = await open(browser, 'ines', theme);
    for (const path of await workPaths(page)) await test.step(path, () => check(page, path));
  });

  test(`axe finds nothing on the routes of lead, administrator and nobody, ${theme}`, async ({ browser }) => {
    test.setTimeout(120_000);
    const wren = await open(browser, 'wren', theme);
    for (const path of ['/people', '/audit']) await check(wren, path);
    const tove = await open(browser, 'tove', theme);
    await check(tove, '/programmes/new');
    const nobody = await (await browser.newContext({ colorScheme: theme })).newPage();
    for (const path of ['/sign-in', '/forgot-password', '/reset-password', '/accept-invitation'])
      await check(nobody, path);
  });
}
