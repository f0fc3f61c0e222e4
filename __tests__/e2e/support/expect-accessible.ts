import { AxeBuilder } from '@axe-core/playwright';
import { expect, type Page } from '@playwright/test';

/** No fault that axe can see on the page as it stands, by light and by night: WCAG and its own good practice. */
export async function expectAccessible(page: Page): Promise<void> {
  await paint(page, 'light');
  expect(await faults(new AxeBuilder({ page })), `axe, light, ${page.url()}`).toEqual([]);
  await paint(page, 'dark');
  // by night only colours differ
  expect(await faults(new AxeBuilder({ page }).withRules('color-contrast')), `axe, night, ${page.url()}`).toEqual([]);
}

async function paint(page: Page, colorScheme: 'light' | 'dark'): Promise<void> {
  await page.emulateMedia({ colorScheme, reducedMotion: 'reduce' });
  await expect(page.locator('html')).toHaveCSS('color-scheme', colorScheme);
}

async function faults(axe: AxeBuilder): Promise<string[]> {
  const { violations } = await axe.analyze();
  return violations.flatMap(({ id, nodes }) => nodes.map(({ target }) => `${id}: ${target.join(' ')}`));
}
