import { expect, type Page } from '@playwright/test';

import { cellsUnder, heads, lineText, thicknessOf, type Numbers } from './numbers';

/** The client's page says the schedule and the quantities as they were frozen. */
export async function expectClientReads(page: Page, { schedule, takeoff }: Numbers): Promise<void> {
  const blocks = page.getByRole('list', { name: 'Schedule of insulation' }).getByRole('listitem');
  await expect(blocks).toHaveCount(schedule.rows.length);
  const said = await blocks.allInnerTexts();
  schedule.rows.forEach((row, index) => {
    for (const part of [row.service, row.sizes.join(', '), row.places.join(', '), thicknessOf(row), row.finish])
      expect(said[index], `Row ${index + 1} of the schedule`).toContain(part);
  });
  for (const [kind, { title, columns }] of Object.entries(heads)) {
    const lines = takeoff.lines.filter(({ appliesTo }) => appliesTo === kind);
    expect(await cellsUnder(page.getByRole('table', { name: title }), columns)).toEqual(lines.map(lineText));
  }
}
