import { execFileSync } from 'node:child_process';
import fs from 'node:fs';

import type { Locator, Page } from '@playwright/test';

import type { Schedule, ScheduleRow, Takeoff, TakeoffLine } from '@/api/contracts/schedule';
import { thicknessText } from '@/api/contracts/words-text';

export type Numbers = { schedule: Schedule; takeoff: Takeoff };

/** Downloads a PDF as a reader does; gives its bytes, and its text laid out as on the page. */
export async function readDownload(page: Page, link: Locator): Promise<{ bytes: Buffer; text: string }> {
  const download = page.waitForEvent('download');
  await link.click();
  const file = await (await download).path();
  const text = execFileSync('pdftotext', ['-layout', file, '-'], { encoding: 'utf8', maxBuffer: 16 * 1024 * 1024 });
  return { bytes: fs.readFileSync(file), text };
}

/** What of a table's cells stands under these heads, row by row. */
export const cellsUnder = (table: Locator, heads: readonly string[]): Promise<string[][]> =>
  table.evaluate((element, wanted) => {
    const texts = (row: Element) => [...row.children].map((cell) => cell.textContent?.trim() ?? '');
    const [head = [], ...rows] = [...element.querySelectorAll('thead tr, tbody tr')].map(texts);
    return rows.map((row) => wanted.map((name) => row[head.indexOf(name)] ?? `no column ${name}`));
  }, heads);

/** A line of the takeoff as it must read: service, size, thickness, length or pieces, area. */
export function lineText({ service, size, names, length, count, area }: TakeoffLine): string[] {
  const measured = length === null ? String(count ?? '') : length.toFixed(1);
  return [service, size, thicknessText(names, 'SI'), measured, area === null ? '' : area.toFixed(2)];
}

export const heads = {
  pipe: { title: 'Pipes and tubes', columns: ['Service', 'Size', 'Thickness', 'Length m', 'Finished area m²'] },
  duct: { title: 'Ducts', columns: ['Service', 'Size', 'Thickness', 'Length m', 'Finished area m²'] },
  equipment: { title: 'Equipment', columns: ['Service', 'Item', 'Thickness', 'Pieces', 'Finished area m²'] },
} as const;

/** The thickness of a schedule's row, "38 + 38 mm". */
export const thicknessOf = ({ layers }: ScheduleRow): string =>
  thicknessText(
    layers.flatMap(({ thickness }) => thickness ?? []),
    'SI',
  );

/**
 * Which lines of schedule and takeoff the text of a PDF does not have as they are. A cell may be broken over several
 * lines, its numbers never: they are looked for side by side.
 */
export function missingIn(text: string, { schedule, takeoff }: Numbers): string[] {
  const lines = takeoff.lines.map(({ names, length, area, count, runNumbers }) => [
    thicknessText(names, 'SI').replace(' mm', ''),
    ...(length === null ? [] : [length.toFixed(1)]),
    ...(area === null ? [] : [area.toFixed(2)]),
    ...(count === null ? [] : [String(count)]),
    runNumbers[0] ?? '',
  ]);
  const rows = schedule.rows.map((row) => [
    thicknessOf(row).replace(' mm', ''),
    row.source === 'chosen' ? 'chosen' : `specification ${row.specificationLabel}`,
  ]);
  const patternOf = (parts: readonly string[]) => new RegExp(`(^|\\s)${parts.map(literally).join('\\s+')}\\b`, 'm');
  return [...lines, ...rows].filter((parts) => !patternOf(parts).test(text)).map((parts) => parts.join(' '));
}

const literally = (text: string) => text.replace(/[.*+?^${}()|[\]\\]/g, '\\$&');
