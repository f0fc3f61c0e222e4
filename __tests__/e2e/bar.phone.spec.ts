import { expectAccessible } from './support/expect-accessible';
import { demoJob } from './support/jobs';
import { expectScreen, open } from './support/open';
import { expect, test } from './support/test';

test('the rest of the places and the person stand behind "More"', async ({ page }) => {
  const { path } = await demoJob(page.request);
  await open(page, `${path}/runs`, 'Runs');
  await page.getByRole('button', { name: 'More' }).click();
  await expect(page.getByRole('dialog').getByText('Tamsin Orrowby')).toBeVisible();
  await expectAccessible(page);
  await page.getByRole('dialog').getByRole('link', { name: 'Documents' }).click();
  await expectScreen(page, 'Documents');
  await expect(page.getByRole('dialog')).toHaveCount(0);
});

test('the list is narrowed behind one line, and says to what', async ({ page }) => {
  const { path } = await demoJob(page.request);
  await open(page, `${path}/runs`, 'Runs');
  await page.getByRole('button', { name: 'Narrow the list' }).click();
  await page.getByLabel('Service').selectOption('Steam, 7 bar gauge');
  await expect(page.getByRole('button', { name: 'Steam, 7 bar gauge' })).toBeVisible();
  await expect(page.getByRole('list', { name: 'Runs' }).getByRole('listitem').first()).toContainText('Steam');
  await expectAccessible(page);
});
