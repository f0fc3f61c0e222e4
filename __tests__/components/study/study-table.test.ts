import { studyTable, tableNotes, tableText } from '@/components/study/study-table';

import { hotSteam } from '../../support/run-study';

const told = { runStudy: hotSteam, standing: { specified: 4, chosen: 2, proposed: 6 }, units: 'SI' as const };

it('holds the numbers of the strip, one row for each thickness, units in the head', () => {
  const { columns, rows } = studyTable(told);
  expect(columns.map(({ label, unit }) => [label, unit])).toEqual([
    ['Thickness', undefined],
    ['Outside diameter', 'mm'],
    ['Surface for touch', '°C'],
    ['Heat flow', 'W/m'],
    ['Limits', undefined],
    ['Which', undefined],
  ]);
  expect(rows.map(({ cells }) => cells)).toContainEqual(['114 mm', '355.6', '48.6', '32.7', 'meets all', 'proposed']);
  expect(rows[0]!.cells).toEqual(['bare', '114.3', '184.0', '831.9', 'fails touch, fails energy code', '']);
  expect(rows).toHaveLength(hotSteam.study.candidates.length);
});

it('reads in inches and Fahrenheit for who measures so', () => {
  const { columns, rows } = studyTable({ ...told, units: 'IP' });
  expect(columns.map(({ unit }) => unit)).toEqual([undefined, 'in', '°F', 'Btu/(h·ft)', undefined, undefined]);
  expect(rows[2]!.cells.slice(0, 3)).toEqual(['1-1/2 in', '7.62', '145.4']);
});

it('goes to a spreadsheet with tabs, and says what it was judged at', () => {
  const lines = tableText(studyTable(told)).split('\n');
  expect(lines[0]).toBe('Thickness\tOutside diameter (mm)\tSurface for touch (°C)\tHeat flow (W/m)\tLimits\tWhich');
  expect(lines[3]!.split('\t')).toEqual(['38 mm', '193.5', '63.0', '64.9', 'fails touch, fails energy code', 'chosen']);
  expect(tableNotes(told)).toEqual([
    'Surface for touch: fluid 184 °C, hottest air 40 °C, still, limit 60.0 °C.',
    'Heat flow: fluid 170 °C, mean air 33 °C, still.',
  ]);
});
