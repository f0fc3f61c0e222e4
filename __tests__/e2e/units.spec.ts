import type { Page } from '@playwright/test';

import { sessionSchema } from '@/api/contracts/session';

import { write } from './support/api';
import { demoJob } from './support/jobs';
import { expectScreen, open } from './support/open';
import { expect, test } from './support/test';

// The choice belongs to the person: each project has its own, so that neither changes what the other reads.
const readers = { phone: 'jorun', desk: 'hanneke' } as const;

async function choose(page: Page, units: RegExp): Promise<void> {
  const more = page.getByRole('button', { name: 'More' });
  const onPhone = (page.viewportSize()?.width ?? 0) < 720;
  if (onPhone) await more.click();
  const saved = page.waitForResponse((response) => response.request().method() === 'PATCH');
  await page.getByRole('radio', { name: units }).click();
  expect((await saved).ok()).toBe(true);
  await expect(page.getByRole('radio', { name: units })).toBeChecked();
  if (onPhone) await page.getByRole('button', { name: 'Close' }).click();
}

test('inch-pound and back: what was typed stays to the letter', async ({ openAs }, { project }) => {
  const page = await openAs(project.name === 'phone' ? readers.phone : readers.desk);
  const { path, run } = await demoJob(page.request);
  const r30 = `${path}/runs/${run('R30').id}`;
  const before = run('R30').shape;
  const length = page.getByRole('textbox', { name: 'Length' });
  await write(page.request, { method: 'PATCH', path: '/session', body: { units: 'SI' }, schema: sessionSchema });

  await open(page, `${path}/runs`, 'Runs');
  await choose(page, /^Inch-pound/);
  await expect(page.getByText(/8102\.\d ft/).first()).toBeVisible();
  await open(page, `${r30}/edit`, 'Run R30');
  await expect(length).toHaveValue('282.1522');
  await expect(length).toHaveAccessibleDescription(/Typed as 86 m/);

  await open(page, `${path}/runs`, 'Runs');
  await choose(page, /^SI/);
  await open(page, `${r30}/edit`, 'Run R30');
  await expect(length).toHaveValue('86');
  await page.goBack();
  await expectScreen(page, 'Runs');
  expect((await demoJob(page.request)).run('R30').shape).toEqual(before);
});
