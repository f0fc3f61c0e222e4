import { expectAccessible } from './support/expect-accessible';
import { demoJob } from './support/jobs';
import { password, people } from './support/people';
import { expect, test } from './support/test';

test.use({ person: null });

test.beforeEach(({ watch }) => {
  // the browser says every 401 in its console, also that of asking who is signed in
  watch.allow(/status of 401/);
});

test('refuses a wrong password in one sentence, and keeps the address', async ({ page }) => {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(people.hanneke);
  await page.getByLabel('Password').fill('not the password');
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByRole('alert')).toHaveText('E-mail and password do not match');
  await expect(page.getByLabel('E-mail')).toHaveValue(people.hanneke);
  await expect(page.getByLabel('Password')).toHaveValue('');
  await expect(page.getByLabel('Password')).toBeFocused();
  await expectAccessible(page);
});

test('says at the field what is not filled in', async ({ page }) => {
  await page.goto('/sign-in');
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByLabel('E-mail')).toHaveAccessibleDescription('Must be an e-mail address');
  await expect(page.getByLabel('Password')).toHaveAccessibleDescription('Must be filled in');
  await expect(page.getByLabel('E-mail')).toBeFocused();
  await expectAccessible(page);
});

test('a deep link asks to sign in and then opens where it leads, filters included', async ({ page, openAs }) => {
  const { path, run } = await demoJob((await openAs('tamsin')).request);
  const asked = `${path}/runs?service=${run('R30').serviceId}`;
  await page.goto(asked);
  await expect(page).toHaveURL(/\/sign-in\?next=/);
  await page.getByLabel('E-mail').fill(people.dov);
  await page.getByLabel('Password').fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByRole('heading', { name: 'Runs', level: 1 })).toBeVisible();
  await expect(page).toHaveURL(asked);
  await expect(page.getByLabel('Service')).toHaveValue(run('R30').serviceId);
});

test('signing out ends the session: the way back leads to the sign-in page', async ({ page }, { project }) => {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(people.jorun);
  await page.getByLabel('Password').fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByRole('heading', { name: 'Jobs', level: 1 })).toBeVisible();
  if (project.name === 'phone') await page.getByRole('button', { name: 'More' }).click();
  await page.getByRole('button', { name: 'Sign out' }).click();
  await expect(page.getByRole('heading', { name: 'Sign in' })).toBeVisible();
  await page.goto('/jobs');
  await expect(page.getByRole('heading', { name: 'Sign in' })).toBeVisible();
});
