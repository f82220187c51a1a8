import type { Browser, Page } from '@playwright/test';
import { expect } from '@playwright/test';

/** The people of the demo; their passwords are printed by the start command. */
export const PASSWORDS = {
  ines: 'curlew-over-saltmarsh',
  marek: 'bittern-in-the-reeds',
  tove: 'lapwing-at-low-tide',
  priya: 'plover-reads-the-mud',
  wren: 'heron-keeps-the-keys',
} as const;
export type Who = keyof typeof PASSWORDS;

export async function signIn(page: Page, who: Who): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(`${who}@saltmarsh.example`);
  await page.getByLabel('Password').fill(PASSWORDS[who]);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByRole('heading', { level: 1, name: 'Programmes' })).toBeVisible();
}

/** A page of its own, as if on another machine, signed in. */
export async function openAs(browser: Browser, who: Who): Promise<Page> {
  const context = await browser.newContext();
  const page = await context.newPage();
  await signIn(page, who);
  return page;
}

interface Listed {
  readonly items: readonly {
    readonly id: string;
    readonly name?: string;
    readonly number?: number;
    readonly designName?: string;
    readonly state?: string;
  }[];
}

/** Reads a list of the API with the session of the page, to find where to go. */
export async function listed(page: Page, path: string): Promise<Listed['items']> {
  const answer = await page.request.get(`/api/v1${path}`);
  expect(answer.ok(), `${path} answers ${answer.status()}`).toBe(true);
  return ((await answer.json()) as Listed).items;
}

export async function programmeId(page: Page, name: string): Promise<string> {
  const found = (await listed(page, '/programmes')).find((programme) => programme.name === name);
  if (found === undefined) throw new Error(`no programme ${name}`);
  return found.id;
}
