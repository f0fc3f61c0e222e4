import type { Page } from '@playwright/test';

import { expectAccessible } from './support/expect-accessible';
import { addressMail, freeze, revisionIn } from './support/documents';
import { copyOfDemo, demoJob } from './support/jobs';
import { expectScreen, open } from './support/open';
import { frozenJob, newContact, send } from './support/sending';
import { expect, test } from './support/test';

const study = 'DN 100 steel, Service tunnel';

async function openStudy(page: Page): Promise<void> {
  const { path, run } = await demoJob(page.request);
  await open(page, `${path}/runs/${run('R30').id}`, study);
}

async function close(page: Page): Promise<void> {
  await page.keyboard.press('Escape');
  await expect(page.getByRole('dialog')).toHaveCount(0);
}

test('a study as a table', async ({ page }) => {
  await openStudy(page);
  await page.getByRole('button', { name: 'As a table' }).click();
  const table = page.getByRole('dialog').getByRole('table');
  await expect(table.getByRole('row', { name: /^114\smm.*48\.\d.*meets all.*proposed/ })).toBeVisible();
  await expectAccessible(page);
});

test('the working of a surface, of the energy code and of the heat flow', async ({ page }) => {
  await openStudy(page);
  for (const name of ['Working of touch', 'Working of energy code', 'Working of heat flow']) {
    await page.getByRole('button', { name }).click();
    await expect(page.getByRole('dialog').getByRole('heading', { name: /^1\. / })).toBeVisible();
    await expectAccessible(page);
    await close(page);
  }
});

test('a finish and a thickness of a run’s own ask for a reason', async ({ page }) => {
  await openStudy(page);
  await page.getByRole('button', { name: 'Change the finish' }).click();
  const finish = page.getByRole('dialog', { name: 'Change the finish' });
  await finish.getByLabel('Reason').fill('');
  await finish.getByRole('button', { name: 'Change the finish' }).click();
  await expect(finish.getByLabel('Reason')).toHaveAccessibleDescription(/Must be filled in/);
  await expectAccessible(page);
  await page.keyboard.press('Escape');
  const question = page.getByRole('alertdialog', { name: 'Leave without saving?' });
  await expectAccessible(page);
  await question.getByRole('button', { name: 'Leave without saving' }).click();
  await page.getByRole('button', { name: 'Use 114 mm' }).click();
  await expect(page.getByRole('dialog', { name: 'Use 114 mm' })).toBeVisible();
  await expectAccessible(page);
});

test('a thickness is used, undone and put back', async ({ page }) => {
  const { path, run } = await copyOfDemo(page.request, ['R29']);
  await open(page, `${path}/runs/${run('R29').id}`, 'DN 200 steel, Service tunnel');
  await page.getByRole('button', { name: 'Use 114 mm' }).click();
  await page.getByRole('dialog').getByLabel('Reason').fill('The engineer agrees, mail of today');
  await page.getByRole('dialog').getByRole('button', { name: 'Use 114 mm' }).click();
  await expect(page.getByRole('radio', { name: /^114\smm: .*chosen, proposed$/ })).toBeVisible();
  await expectAccessible(page);
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(page.getByText('R29 is as it was.')).toBeVisible();
  await expect(page.getByRole('radio', { name: /^114\smm: .*meets all, proposed$/ })).toBeVisible();
});

test('freezing, sending with a preview, revoking', async ({ page }) => {
  test.slow();
  const { path } = await copyOfDemo(page.request, ['R30', 'R32', 'D01']);
  await open(page, `${path}/documents`, 'Documents');
  await page.getByRole('button', { name: 'Freeze Revision A' }).click();
  await expect(page.getByRole('alertdialog', { name: 'Freeze Revision A?' })).toBeVisible();
  await expectAccessible(page);
  await page.keyboard.press('Escape');
  const letter = await freeze(page);
  const subject = `Takeoff ${crypto.randomUUID().slice(0, 8)}`;
  const dialog = await addressMail({ page, letter, to: 'Marisel Quonder', subject });
  await expectAccessible(page);
  await dialog.getByRole('button', { name: 'How it reads' }).click();
  await expect(dialog.getByRole('heading', { name: subject })).toBeVisible();
  await expectAccessible(page);
  await dialog.getByRole('button', { name: 'Send', exact: true }).click();
  await expect(revisionIn(page, letter).getByText(/\bsent\s\d/)).toBeVisible({ timeout: 60_000 });
  await expectAccessible(page);
  await page.getByRole('button', { name: 'Revoke the link of Marisel Quonder' }).click();
  const question = page.getByRole('alertdialog', { name: 'Revoke the link of Marisel Quonder?' });
  await expect(question).toBeVisible();
  await expectAccessible(page);
  await question.getByRole('button', { name: 'Revoke' }).click();
  await expect(revisionIn(page, letter).getByText(/The link was revoked/)).toBeVisible();
});

test('a mail that is refused says the server’s words', async ({ page }) => {
  test.slow();
  const job = await frozenJob(page.request, ['R30']);
  const contact = await newContact(page.request, job, `refuse.${crypto.randomUUID()}@client.example`);
  await send(page.request, { revision: job.revision, contact, subject: 'Takeoff', until: 'refused' });
  await open(page, `${job.path}/documents`, 'Documents');
  await expect(page.getByText(/The mail server: .*No such mailbox here/)).toBeVisible();
  await expect(page.getByRole('button', { name: 'Send again' })).toBeVisible();
  await expectAccessible(page);
});

test('a run is removed after a question, and comes back', async ({ page }) => {
  const { path, run } = await copyOfDemo(page.request, ['R30', 'R31']);
  await open(page, `${path}/runs/${run('R31').id}/edit`, 'Run R31');
  await page.getByRole('button', { name: 'Remove run R31' }).click();
  const question = page.getByRole('alertdialog', { name: 'Remove run R31?' });
  await expect(question).toBeVisible();
  await expectAccessible(page);
  await question.getByRole('button', { name: 'Remove' }).click();
  await expectScreen(page, 'Runs');
  await expect(page.getByText(/^1 run/).first()).toBeVisible();
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(page.getByText(/^2 runs/).first()).toBeVisible();
});

test('what is in use cannot be deleted, and says by what', async ({ page }) => {
  const { path, run } = await demoJob(page.request);
  await open(page, `${path}/places/${run('R30').placeId}`, 'Service tunnel');
  await page.getByRole('button', { name: 'Delete place Service tunnel' }).click();
  await expect(page.getByRole('dialog', { name: 'Service tunnel is in use' })).toBeVisible();
  await expectAccessible(page);
});
