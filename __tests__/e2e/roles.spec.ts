import { demoJob } from './support/jobs';
import { expectScreen, open } from './support/open';
import { expect, test } from './support/test';

test.describe('a foreman', () => {
  test.use({ person: 'dov' });

  test('reads jobs, runs and studies, and finds nothing to change in them', async ({ page }) => {
    const { path, run } = await demoJob(page.request);
    await open(page, '/jobs', 'Jobs');
    await expect(page.getByRole('link', { name: 'New job' })).toHaveCount(0);
    await open(page, `${path}/runs`, 'Runs');
    await expect(page.getByRole('link', { name: 'New run' })).toHaveCount(0);
    await open(page, `${path}/runs/${run('R30').id}`, 'DN 100 steel, Service tunnel');
    await expect(page.getByRole('button', { name: 'As a table' })).toBeVisible();
    await expect(page.getByRole('link', { name: 'Edit the run' })).toHaveCount(0);
    await expect(page.getByRole('button', { name: /^(Use|Keep|Change|Back to)/ })).toHaveCount(0);
    await open(page, `${path}/schedule`, 'Schedule');
    await open(page, `${path}/flags`, 'Flags');
  });

  test('opens a run from the list as its study, not as a form', async ({ page }, { project }) => {
    const { path } = await demoJob(page.request);
    await open(page, `${path}/runs`, 'Runs');
    // both show it without scrolling: the grid draws only what is in sight
    if (project.name === 'phone') await page.getByRole('link', { name: /R01/ }).click();
    else await page.getByRole('row', { name: /R01/ }).click();
    await expectScreen(page, '2 in copper tube, Concealed ceiling void');
  });

  test('cannot freeze or send, not by an address typed by hand either', async ({ page, watch }) => {
    watch.allow(/status of 403/);
    const { path, run } = await demoJob(page.request);
    await page.goto(`${path}/documents`);
    await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
    await expect(page.locator('[aria-busy="true"]')).toHaveCount(0);
    await expect(page.getByRole('button', { name: /^(Freeze|Send|Revoke)/ })).toHaveCount(0);
    await page.goto(`${path}/runs/${run('R30').id}/edit`);
    await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
    await expect(page.locator('[aria-busy="true"]')).toHaveCount(0);
    await expect(page.getByRole('button', { name: 'Save the run' })).toHaveCount(0);
    await page.goto(`${path}/runs/new`);
    await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
    await expect(page.locator('[aria-busy="true"]')).toHaveCount(0);
    await expect(page.getByRole('button', { name: 'Save the run' })).toHaveCount(0);
  });
});

test.describe('an estimator who may not send', () => {
  test.use({ person: 'jorun' });

  test('sees what was sent and may freeze, but nothing to send with', async ({ page }) => {
    const { path } = await demoJob(page.request);
    await open(page, `${path}/documents`, 'Documents');
    await expect(page.getByRole('button', { name: /^Freeze Revision/ })).toBeVisible();
    const sent = page.getByRole('region', { name: 'Revision A' });
    await expect(sent.getByRole('list', { name: 'Mail of Revision A' })).toContainText('Marisel Quonder');
    await expect(page.getByRole('button', { name: /^(Send|Revoke)/ })).toHaveCount(0);
  });
});
