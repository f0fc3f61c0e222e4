import { expectAccessible } from './support/expect-accessible';
import { copyOfDemo } from './support/jobs';
import { open } from './support/open';
import { expect, test } from './support/test';

test('a run is edited beside the list, which follows', async ({ page }) => {
  const { path } = await copyOfDemo(page.request, ['R29', 'R30', 'R31']);
  await open(page, `${path}/runs`, 'Runs');
  const grid = page.getByRole('grid', { name: 'Runs' });
  await grid.getByRole('row', { name: /R30/ }).click();
  const form = page.getByRole('form', { name: 'Run R30' });
  await expectAccessible(page);
  await form.getByRole('textbox', { name: 'Length' }).fill('90.5');
  await form.getByRole('button', { name: 'Save the run' }).click();
  await expect(grid.getByRole('row', { name: /R30.*90\.5/ })).toBeVisible();
});

test('a column sorts the list one way, then the other', async ({ page }) => {
  const { path } = await copyOfDemo(page.request, ['R29', 'R30', 'R31', 'R32']);
  await open(page, `${path}/runs`, 'Runs');
  const grid = page.getByRole('grid', { name: 'Runs' });
  const numbers = async () =>
    (await grid.getByRole('row').allInnerTexts()).slice(1).map((row) => /[RD]\d+/.exec(row)?.[0]);
  const head = grid.getByRole('button', { name: /^Length/ });
  await head.click();
  const first = await numbers();
  await head.click();
  await expect.poll(numbers).toEqual(first.toReversed());
  await expect(grid.getByRole('columnheader', { name: /^Length/ })).toHaveAttribute('aria-sort', /ending$/);
  await expectAccessible(page);
});
