import { expect, type Page } from '@playwright/test';

/** Opens an address and waits until the screen is there whole, with nothing on its way. */
export async function open(page: Page, path: string, heading: string | RegExp): Promise<void> {
  await page.goto(path);
  await expectScreen(page, heading);
}

export async function expectScreen(page: Page, heading: string | RegExp): Promise<void> {
  await expect(page.getByRole('heading', { level: 1, name: heading })).toBeVisible();
  await expect(page.locator('[aria-busy="true"]')).toHaveCount(0);
}
