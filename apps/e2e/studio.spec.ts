import type { Page } from '@playwright/test';
import { expect, test } from '@playwright/test';
import { listed, openAs, programmeId } from './people.ts';

/** A draft of this test's own, so that no journey meets another's. */
async function openDraft(page: Page): Promise<string> {
  const curlew = await programmeId(page, 'Curlew 48');
  const v3 = (await listed(page, `/programmes/${curlew}/versions`)).find((version) => version.number === 3);
  await page.goto(`/versions/${v3?.id ?? ''}`);
  await page.getByRole('button', { name: 'Open draft from it' }).click();
  await expect(page).toHaveURL(/\/drafts\//u);
  await expect(page.getByRole('grid')).toBeVisible();
  return new URL(page.url()).pathname;
}

/** The figure of maximum CP, once it belongs to the newest edit. */
const cp = (page: Page) => page.locator('tr[data-number]').first().locator('td[data-current="true"]');
const saved = (page: Page) => expect(page.locator('[data-save="saved"]')).toBeVisible();

test('an edit moves the curve and the numbers, undo brings them back', async ({ browser }) => {
  const page = await openAs(browser, 'ines');
  await openDraft(page);
  await expect(cp(page)).toContainText(/0\.4\d{3}/u);
  const before = (await cp(page).textContent()) ?? '';
  await page.getByRole('gridcell', { name: '0.717' }).click();
  await page.keyboard.type('0.6');
  await page.keyboard.press('Enter');
  await expect(cp(page)).not.toHaveText(before);
  await saved(page);
  await page.keyboard.press('Control+z');
  await expect(page.getByRole('gridcell', { name: '0.717' })).toBeVisible();
  await expect(cp(page)).toHaveText(before);
});

test('a pasted block with one bad cell shows the cell and keeps the rest', async ({ browser }) => {
  const page = await openAs(browser, 'ines');
  await openDraft(page);
  await page.getByRole('gridcell', { name: '0.630' }).click();
  await page.evaluate(() => {
    const data = new DataTransfer();
    data.setData('text/plain', '0.62\t5.9\n0,55\t4.7\n0.50\t3.8');
    document.activeElement?.dispatchEvent(
      new ClipboardEvent('paste', { clipboardData: data, bubbles: true, cancelable: true }),
    );
  });
  await expect(page.getByRole('gridcell', { name: /0,55/u })).toBeVisible();
  await expect(page.getByRole('gridcell', { name: '0.620' })).toBeVisible();
  await expect(page.getByRole('gridcell', { name: '3.80' })).toBeVisible();
  await expect(page.getByText(/decimal comma/u).first()).toBeVisible();
  await page.getByRole('button', { name: 'Save version' }).click();
  await expect(page.getByRole('dialog').getByText(/decimal comma/u)).toBeVisible();
});

test('two tabs never lose an edit: the loser sees both and chooses', async ({ browser }) => {
  const first = await openAs(browser, 'ines');
  const path = await openDraft(first);
  const second = await first.context().newPage();
  await second.goto(path);
  await expect(second.getByRole('grid')).toBeVisible();
  await first.getByRole('gridcell', { name: '0.454' }).click();
  await first.keyboard.type('0.444');
  await first.keyboard.press('Enter');
  await saved(first);
  await second.getByRole('gridcell', { name: '0.416' }).click();
  await second.keyboard.type('0.400');
  await second.keyboard.press('Enter');
  const dialog = second.getByRole('dialog');
  await expect(dialog).toContainText('0.444');
  await expect(dialog).toContainText('0.4');
  await dialog.getByRole('button', { name: /^Keep/u }).click();
  await saved(second);
  await expect(second.getByRole('gridcell', { name: '0.400' })).toBeVisible();
});

test('edits made offline are kept and stored on return', async ({ browser }) => {
  const page = await openAs(browser, 'ines');
  const path = await openDraft(page);
  await page.context().setOffline(true);
  await page.getByRole('gridcell', { name: '0.358' }).click();
  await page.keyboard.type('0.333');
  await page.keyboard.press('Enter');
  await expect(page.locator('[data-save="offline"]')).toBeVisible();
  await page.context().setOffline(false);
  await saved(page);
  await page.goto(path);
  await expect(page.getByRole('gridcell', { name: '0.333' })).toBeVisible();
});
