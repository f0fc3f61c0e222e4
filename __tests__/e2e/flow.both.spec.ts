import type { APIRequestContext, Page } from '@playwright/test';

import { judgementSchema } from '@/api/contracts/judgement';
import { runsPatchedSchema, type Run } from '@/api/contracts/run';
import { scheduleSchema, takeoffSchema } from '@/api/contracts/schedule';

import { ask, write } from './support/api';
import { expectClientReads } from './support/client';
import { addressMail, freeze, linkInMail, revisionIn } from './support/documents';
import { demoJob } from './support/jobs';
import { missingIn, readDownload } from './support/numbers';
import { expectScreen } from './support/open';
import { nobody, password, people } from './support/people';
import { desk, phone } from './support/sizes';
import { expect, test } from './support/test';

// Both change the same run and freeze the same job: one after the other.
test.describe.configure({ mode: 'default', timeout: 240_000 });
test.use({ person: null });

const marisel = 'Marisel Quonder';
const study = 'DN 100 steel, Service tunnel';
const finishes = { before: /^Bright aluminium jacket\b/, after: /^White-painted aluminium jacket\b/ };

for (const [name, use] of Object.entries({ phone, desk })) {
  test.describe(name, () => {
    test.use(use);

    test('from signing in to the numbers that the client reads', async ({ page, openAs, browser, watch }) => {
      watch.allow(/status of 401/);
      const mark = crypto.randomUUID().slice(0, 8);
      const reason = `Painted after the fitting-out, site note ${mark}`;
      const { path, run } = await openJob(page);
      const before = await ask(page.request, `${path}/judgement`, judgementSchema);
      const flags = before.runs.reduce((sum, judged) => sum + judged.flags.length, 0);
      try {
        await openStudy(page);
        await expect(page.getByText(/It would reach 63\.[01]\s°C where hands can; the limit is 60\s°C/)).toBeVisible();
        await expect(page.getByRole('radio', { name: /^114\smm: .*proposed$/ })).toBeVisible();

        await changeFinish(page, { finish: finishes.after, reason });
        await expect(page.getByText(/63\.[01]\s°C/)).toHaveCount(0);
        await expect(page.getByRole('radio', { name: /^38\smm: .*fails energy code, chosen$/ })).toBeVisible();

        await goTo(page, 'Flags');
        await expect(page.getByText(`${flags - 1} flags on`)).toBeVisible();
        const flagged = page.getByRole('list', { name: 'Flags' }).getByRole('listitem').filter({ hasText: 'R30' });
        await expect(flagged).toContainText('energy code');
        await expect(flagged).not.toContainText('touch');
        await goTo(page, 'Schedule');
        await expect(page.getByText(`chosen: ${reason}`)).toBeVisible();

        await goTo(page, 'Documents');
        const letter = await freeze(page);
        const frozen = {
          schedule: await ask(page.request, `${path}/schedule`, scheduleSchema),
          takeoff: await ask(page.request, `${path}/takeoff`, takeoffSchema),
        };

        // what is frozen stays as it was, whatever becomes of the run
        await page.goto(`${path}/runs/${run('R30').id}`);
        await changeFinish(page, { finish: finishes.before, reason: run('R30').override?.reason ?? '' });
        await expect(page.getByText(/It would reach 63\.[01]\s°C/)).toBeVisible();
        await page.goto(`${path}/flags`);
        await expect(page.getByText(`${flags} flags on`)).toBeVisible();

        await page.goto(`${path}/documents`);
        const subject = `Takeoff for St Ellowyn ${mark}`;
        const dialog = await addressMail({ page, letter, to: marisel, subject });
        await dialog.getByRole('button', { name: 'How it reads' }).click();
        await expect(dialog.getByRole('heading', { name: subject })).toBeVisible();
        const preview = dialog.frameLocator('iframe').getByRole('link', { name: 'Open the takeoff' });
        await expect(preview, 'The mail is seen with its own styles').toHaveCSS('color', 'rgb(255, 255, 255)');
        await dialog.getByRole('button', { name: 'Send', exact: true }).click();
        const mail = revisionIn(page, letter).getByRole('list', { name: `Mail of Revision ${letter}` });
        await expect(mail.getByText(/\bsent\s\d/)).toBeVisible({ timeout: 60_000 });

        const inbox = await openAs(null);
        const { link, attachment } = await linkInMail(inbox, subject);

        const client = await browser.newContext({ ...phone, storageState: nobody });
        watch.listen(client);
        const clientPage = await client.newPage();
        await clientPage.goto(link);
        await expectScreen(clientPage, (await demoJob(page.request)).job.name);
        await expect(clientPage.getByText(`For ${marisel}.`)).toBeVisible();
        await expectClientReads(clientPage, frozen);
        await expect(clientPage.getByText(`chosen: ${reason}`)).toBeVisible();

        const pdf = await readDownload(clientPage, clientPage.getByRole('link', { name: /^PDF, / }));
        expect(pdf.bytes.equals(attachment), 'The PDF behind the link is the one in the mail').toBe(true);
        expect(pdf.text.replace(/\s+/g, ' ')).toContain(mark);
        expect(missingIn(pdf.text, frozen)).toEqual([]);
        await client.close();

        await page.reload();
        await expect(revisionIn(page, letter).getByText('The link was opened once')).toBeVisible();
      } finally {
        await putBack(page.request, { path, run: run('R30') });
      }
    });
  });
}

async function openJob(page: Page) {
  await page.goto('/');
  await page.getByLabel('E-mail').fill(people.tamsin);
  await page.getByLabel('Password').fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expectScreen(page, 'Jobs');
  const demo = await demoJob(page.request);
  await page.getByRole('link', { name: new RegExp(demo.job.number) }).click();
  await expectScreen(page, demo.job.name);
  return demo;
}

/** From the list of runs: a card on a phone; on a desk a row, which opens its form. */
async function openStudy(page: Page): Promise<void> {
  await goTo(page, 'Runs');
  if (isPhone(page)) {
    await page.getByRole('link', { name: /R30/ }).click();
  } else {
    await page.getByLabel('Service').selectOption('Steam, 7 bar gauge');
    await page.getByRole('row', { name: /R30/ }).click();
    await page.getByRole('link', { name: 'Study' }).click();
  }
  await expectScreen(page, study);
}

async function changeFinish(page: Page, { finish, reason }: { finish: RegExp; reason: string }): Promise<void> {
  await page.getByRole('button', { name: 'Change the finish' }).click();
  const dialog = page.getByRole('dialog', { name: 'Change the finish' });
  const choice = dialog.getByLabel('Finish for this run');
  const label = await choice.getByRole('option', { name: finish }).first().innerText();
  await choice.selectOption({ label });
  await dialog.getByLabel('Reason').fill(reason);
  await dialog.getByRole('button', { name: 'Change the finish' }).click();
  await expect(dialog).toHaveCount(0);
}

/** By the places of the job: the rail, or a phone's bar, with the rest behind "More". */
async function goTo(page: Page, place: 'Runs' | 'Schedule' | 'Flags' | 'Documents'): Promise<void> {
  // a run's study on a phone has its own way back, and no bar
  if (isPhone(page) && /\/runs\/[^/]+$/.test(page.url())) await page.getByRole('link', { name: 'Runs' }).click();
  if (isPhone(page) && place === 'Documents') await page.getByRole('button', { name: 'More' }).click();
  await page.getByRole('link', { name: new RegExp(`^${place}`) }).click();
  await expectScreen(page, place);
}

const isPhone = (page: Page) => (page.viewportSize()?.width ?? 0) < 720;

/** Whatever happened, the demo's run is left as it was found. */
async function putBack(request: APIRequestContext, { path, run }: { path: string; run: Run }): Promise<void> {
  const now = (await demoJob(request)).run('R30');
  if (JSON.stringify(now.override) === JSON.stringify(run.override)) return;
  const body = { put: [{ ...run, version: now.version }], drop: [] };
  await write(request, { method: 'PATCH', path: `${path}/runs`, body, schema: runsPatchedSchema });
}
