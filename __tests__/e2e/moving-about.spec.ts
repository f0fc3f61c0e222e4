import { copyOfDemo, demoJob } from './support/jobs';
import { expectScreen, open } from './support/open';
import { expect, test } from './support/test';

test('the back button goes back through what was opened', async ({ page }) => {
  const { path, run } = await demoJob(page.request);
  await open(page, `${path}/flags`, 'Flags');
  await page.getByRole('link', { name: /R19/ }).click();
  await expectScreen(page, 'DN 150 steel, Plant room');
  await expect(page).toHaveURL(`${path}/runs/${run('R19').id}`);
  const neighbours = page.getByRole('navigation', { name: 'Runs before and after' });
  await neighbours.getByRole('link', { name: /R20/ }).click();
  await expectScreen(page, 'DN 80 steel, Plant room');
  await page.goBack();
  await expectScreen(page, 'DN 150 steel, Plant room');
  await page.goBack();
  await expectScreen(page, 'Flags');
  await page.goForward();
  await expectScreen(page, 'DN 150 steel, Plant room');
});

test('a narrowed list keeps its address', async ({ page }) => {
  const { path } = await demoJob(page.request);
  await open(page, `${path}/runs?flags=hold`, 'Runs');
  await expect(page.getByText('R42').first()).toBeVisible();
  await expect(page.getByText('R30')).toHaveCount(0);
  await page.reload();
  await expectScreen(page, 'Runs');
  await expect(page.getByText('R30')).toHaveCount(0);
});

test.describe('at 320 pixels, as with a page zoomed to four times', () => {
  test.use({ viewport: { width: 320, height: 640 } });

  test('jobs, a study and documents need no scrolling sideways', async ({ page }) => {
    const { path, run } = await copyOfDemo(page.request, ['R30', 'R32']);
    const demo = await demoJob(page.request);
    const screens = [
      ['/jobs', 'Jobs'],
      [`${path}/runs/${run('R30').id}`, 'DN 100 steel, Service tunnel'],
      [`${demo.path}/documents`, 'Documents'],
      [`${path}/schedule`, 'Schedule'],
      [`${path}/runs/${run('R30').id}/edit`, 'Run R30'],
    ] as const;
    for (const [address, heading] of screens) {
      await open(page, address, heading);
      expect(await page.evaluate(tooWide), `${address} is wider than the screen`).toEqual([]);
    }
  });
});

/** What reaches beyond the right edge; only a table and the strip of thicknesses may move sideways in themselves. */
function tooWide(): string[] {
  const edge = document.documentElement.clientWidth;
  const movesByItself = (element: Element): boolean =>
    element.matches('[role="region"]') || element.querySelector(':scope > * > [role="radiogroup"]') !== null;
  const isCut = (element: Element | null): boolean =>
    element !== null &&
    (movesByItself(element) || getComputedStyle(element).textOverflow === 'ellipsis' || isCut(element.parentElement));
  return [...document.body.querySelectorAll('*')]
    .filter((element) => element.getBoundingClientRect().right > edge + 1 && !isCut(element))
    .map((element) => `${element.tagName} ${element.textContent?.slice(0, 40)}`);
}
