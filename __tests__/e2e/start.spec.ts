import { expect, test } from '@playwright/test';

const password = process.env.DEMO_PASSWORD ?? '';
const inbox = process.env.INBOX_URL ?? '';

test('the product is up, under its policy, without a complaint from the browser', async ({ page }) => {
  const complaints: string[] = [];
  page.on('pageerror', (error) => complaints.push(String(error)));
  page.on('console', (message) => {
    // who is signed out is asked to sign in: the browser reports the 401 that tells the page so
    if (message.type() === 'error' && !message.text().includes('401')) complaints.push(message.text());
  });
  const answer = await page.goto('/');
  expect(answer?.headers()['content-security-policy']).toContain("script-src 'self'");
  await expect(page.getByLabel('E-mail')).toBeVisible();
  const loaded = await page.evaluate(async () => {
    const fonts = await document.fonts.ready;
    return [...fonts].filter(({ status }) => status === 'loaded').map(({ family, weight }) => `${family} ${weight}`);
  });
  expect(loaded.join()).toMatch(/Source Sans 3"? 400/);
  expect(complaints).toEqual([]);
});

for (const person of ['hanneke.vossidrow', 'tamsin.orrowby', 'jorun.maplecoate', 'dov.kessrick']) {
  test(`${person} of the demo signs in, and out of a copied cookie when signing out`, async ({ page }) => {
    await page.goto('/sign-in');
    await page.getByLabel('E-mail').fill(`${person}@brackwater.example`);
    await page.getByLabel('Password', { exact: true }).fill(password);
    await page.getByLabel('Password', { exact: true }).press('Enter');
    await expect(page).toHaveURL(/\/jobs$/);
    const cookie = (await page.context().cookies()).find(({ name }) => name === 'thickset');
    expect(cookie).toMatchObject({ httpOnly: true, sameSite: 'Lax' });
    const copied = { Cookie: `thickset=${cookie?.value}` };
    expect((await page.request.get('/api/session', { headers: copied })).status()).toBe(200);
    await page.evaluate(() => fetch('/api/session', { method: 'DELETE', headers: { 'X-Thickset': '1' } }));
    expect((await page.request.get('/api/session', { headers: copied })).status()).toBe(401);
  });
}

test('what the demo sent lies in the local inbox, with its PDF', async ({ page }) => {
  await page.goto(inbox);
  await page.getByRole('link', { name: /Revision A/ }).click();
  await expect(page.getByRole('heading', { level: 1, name: /BLI-0417/ })).toBeVisible();
  const href = await page.getByRole('link', { name: /\.pdf$/ }).getAttribute('href');
  const pdf = await page.request.get(new URL(href ?? '', inbox).href);
  expect((await pdf.body()).subarray(0, 5).toString()).toBe('%PDF-');
});
