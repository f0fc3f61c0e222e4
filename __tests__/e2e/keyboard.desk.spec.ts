import type { Locator, Page } from '@playwright/test';

import { copyOfDemo } from './support/jobs';
import { expectScreen } from './support/open';
import { password, people } from './support/people';
import { expect, test } from './support/test';

test.use({ person: null });

/** Walks with the Tab key until this has the focus, as a person without a mouse does. */
async function tabTo(page: Page, target: Locator): Promise<void> {
  await expect(target).toBeVisible();
  for (let step = 0; step < 80; step += 1) {
    if (await target.evaluate((element) => element === document.activeElement)) return;
    await page.keyboard.press('Tab');
  }
  await expect(target, 'The Tab key leads here').toBeFocused();
}

test('signs in, opens a run, walks its study and freezes a revision without a mouse', async ({
  page,
  openAs,
  watch,
}) => {
  watch.allow(/status of 401/);
  const { job } = await copyOfDemo((await openAs('tamsin')).request, ['R29', 'R30', 'R31']);

  await page.goto('/');
  await expect(page.getByRole('heading', { name: 'Sign in' })).toBeVisible();
  await tabTo(page, page.getByLabel('E-mail'));
  await page.keyboard.type(people.tamsin);
  await page.keyboard.press('Tab');
  await page.keyboard.type(password);
  await page.keyboard.press('Enter');

  await expectScreen(page, 'Jobs');
  await tabTo(page, page.getByRole('link', { name: job.number }));
  await page.keyboard.press('Enter');
  await expectScreen(page, job.name);
  await tabTo(page, page.getByRole('link', { name: 'Runs', exact: true }));
  await page.keyboard.press('Enter');
  await expectScreen(page, 'Runs');

  const rows = page.getByRole('grid', { name: 'Runs' }).getByRole('row');
  await tabTo(page, rows.nth(1));
  await page.keyboard.press('ArrowDown');
  await expect(rows.nth(2)).toBeFocused();
  await page.keyboard.press('End');
  await expect(rows.nth(3)).toBeFocused();
  await page.keyboard.press('ArrowUp');
  await page.keyboard.press('Enter');
  await expect(page.getByRole('form', { name: 'Run R30' })).toBeVisible();
  await tabTo(page, page.getByRole('link', { name: 'Study' }));
  await page.keyboard.press('Enter');
  await expectScreen(page, 'DN 100 steel, Service tunnel');

  await tabTo(page, page.getByRole('radio', { name: /^114 mm/ }));
  await expect(page.getByRole('heading', { name: '114 mm judged at' })).toBeVisible();
  await page.keyboard.press('ArrowLeft');
  await expect(page.getByRole('radio', { name: /^102 mm/ })).toBeFocused();
  await expect(page.getByRole('heading', { name: '102 mm judged at' })).toBeVisible();
  await page.keyboard.press('Home');
  await expect(page.getByRole('radio', { name: /^bare/ })).toBeChecked();
  await page.keyboard.press('End');
  await expect(page.getByRole('radio', { name: /^127 mm/ })).toBeChecked();

  await tabTo(page, page.getByRole('button', { name: 'As a table' }));
  await page.keyboard.press('Enter');
  const table = page.getByRole('dialog').getByRole('table');
  await expect(table.getByRole('row', { name: /38 mm.*63\.0.*chosen/ })).toBeVisible();
  await page.keyboard.press('Escape');
  await expect(page.getByRole('dialog')).toHaveCount(0);
  await expect(page.getByRole('button', { name: 'As a table' })).toBeFocused();

  await tabTo(page, page.getByRole('link', { name: 'Documents' }));
  await page.keyboard.press('Enter');
  await expectScreen(page, 'Documents');
  await tabTo(page, page.getByRole('button', { name: 'Freeze Revision A' }));
  await page.keyboard.press('Enter');
  const question = page.getByRole('alertdialog', { name: 'Freeze Revision A?' });
  // the focus begins on the way out
  await expect(question.getByRole('button', { name: 'Cancel' })).toBeFocused();
  await tabTo(page, question.getByRole('button', { name: 'Freeze Revision A' }));
  await page.keyboard.press('Enter');
  const revision = page.getByRole('region', { name: 'Revision A' });
  await expect(revision.getByRole('link', { name: 'PDF of Revision A' })).toBeVisible();
});
