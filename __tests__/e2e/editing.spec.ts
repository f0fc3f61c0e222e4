import type { Page } from '@playwright/test';

import { copyOfDemo } from './support/jobs';
import { expectScreen, open } from './support/open';
import { expect, test } from './support/test';

const length = (page: Page) => page.getByRole('textbox', { name: 'Length' });
const note = (page: Page) => page.getByRole('textbox', { name: 'Note' });
const save = (page: Page) => page.getByRole('button', { name: 'Save the run' }).click();

test('two windows change one run: the second is told and loses nothing', async ({ page, openAs, watch }) => {
  watch.allow(/status of 409/);
  const { path, run } = await copyOfDemo(page.request, ['R30']);
  const address = `${path}/runs/${run('R30').id}/edit`;
  const other = await openAs('tamsin');
  await open(page, address, 'Run R30');
  await open(other, address, 'Run R30');
  await length(page).fill('88');
  await page.getByRole('textbox', { name: 'Tees' }).fill('6');
  await length(other).fill('91.5');
  await note(other).fill('Measured again');
  await save(other);
  await expect(other.getByText('R30 is saved.')).toBeVisible();

  await save(page);
  await expect(page.getByRole('alert').filter({ hasText: 'Somebody else changed this first' })).toBeVisible();
  const differs = page.getByRole('note').filter({ hasText: 'Here you differ' });
  await expect(differs).toContainText('Yours: 88.00 m');
  await expect(differs).toContainText('Stored now: 91.50 m');
  // theirs where nothing was typed here, mine where it was
  await expect(note(page)).toHaveValue('Measured again');
  await expect(length(page)).toHaveValue('88');
  await save(page);
  await expect(page.getByText('R30 is saved.')).toBeVisible();

  await open(other, address, 'Run R30');
  await expect(length(other)).toHaveValue('88');
  await expect(note(other)).toHaveValue('Measured again');
});

test('no network at "Save": said, kept, and saved when it is back', async ({ page, context, watch }) => {
  watch.allow(/ERR_INTERNET_DISCONNECTED/);
  const { path, run } = await copyOfDemo(page.request, ['R31']);
  await open(page, `${path}/runs/${run('R31').id}/edit`, 'Run R31');
  await length(page).fill('141.5');
  await context.setOffline(true);
  await save(page);
  await expect(page.getByRole('alert')).toContainText('No connection. Nothing was lost');
  await expect(length(page)).toHaveValue('141.5');
  await context.setOffline(false);
  await save(page);
  await expect(page.getByText('R31 is saved.')).toBeVisible();
  await open(page, `${path}/runs/${run('R31').id}/edit`, 'Run R31');
  await expect(length(page)).toHaveValue('141.5');
});

test('bad input lands at its field and nothing is stored', async ({ page }) => {
  const { path, run } = await copyOfDemo(page.request, ['R29']);
  await open(page, `${path}/runs/${run('R29').id}/edit`, 'Run R29');
  for (const [typed, says] of [
    ['0', /Must be more than 0/],
    ['-3', /Must be more than 0/],
    ['a lot', /Must be a number/],
    ['', /Must be filled in/],
    ['999999', /Must be at most/],
  ] as const) {
    await length(page).fill(typed);
    await save(page);
    await expect(length(page)).toHaveAccessibleDescription(says);
    await expect(length(page)).toHaveAttribute('aria-invalid', 'true');
    await expect(length(page)).toHaveValue(typed);
  }
  const stored = await page.request.get(`/api${path}/runs`);
  expect(await stored.json()).toEqual({ runs: [run('R29')] });
});

test('a new run: typed, judged at once, and told apart from what was there', async ({ page }) => {
  const { path } = await copyOfDemo(page.request, ['R30']);
  await open(page, `${path}/runs/new`, 'New run');
  await length(page).fill('12 ft');
  await save(page);
  await expectScreen(page, 'DN 100 steel, Service tunnel');
  await expect(page.getByText(/3\.7 m/).first()).toBeVisible();
});

test('leaving with something typed asks first', async ({ page }) => {
  const { path, run } = await copyOfDemo(page.request, ['R30']);
  await open(page, `${path}/runs/${run('R30').id}`, 'DN 100 steel, Service tunnel');
  await page.getByRole('link', { name: 'Edit the run' }).click();
  await expectScreen(page, 'Run R30');
  await note(page).fill('Not saved');
  // not page.goBack(): it waits for the page that the question holds back
  await page.evaluate(() => window.history.back());
  const question = page.getByRole('alertdialog', { name: 'Leave without saving?' });
  await question.getByRole('button', { name: 'Stay' }).click();
  await expect(note(page)).toHaveValue('Not saved');
  await page.evaluate(() => window.history.back());
  await question.getByRole('button', { name: 'Leave without saving' }).click();
  await expectScreen(page, 'DN 100 steel, Service tunnel');
});

test('leaving a form in which nothing was changed asks nothing', async ({ page }) => {
  const { path, run } = await copyOfDemo(page.request, ['R30']);
  await open(page, `${path}/runs/${run('R30').id}`, 'DN 100 steel, Service tunnel');
  await page.getByRole('link', { name: 'Edit the run' }).click();
  await expectScreen(page, 'Run R30');
  await page.goBack();
  await expectScreen(page, 'DN 100 steel, Service tunnel');
});
