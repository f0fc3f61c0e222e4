import type { JobData } from '@/api/contracts/job-data';
import type { ScheduleRow } from '@/api/contracts/schedule';
import { wordsText } from '@/api/contracts/words-text';
import { judge } from '@/api/services/judging';
import { scheduleOf } from '@/api/services/scheduling';
import { demoInMemory } from '@/db/seeds/demo/in-memory';

import { mineralFibre, override, smallJob, steelPipe } from '../../support/small-job';

const rowsOf = (data: JobData): ScheduleRow[] => scheduleOf(data, judge(data)).rows;

describe('the invented demo job', () => {
  let rows: ScheduleRow[];
  let data: JobData;
  beforeAll(async () => {
    data = await demoInMemory('addendum-1');
    rows = rowsOf(data);
  });
  const rowOf = (number: string) => rows.find(({ runNumbers }) => runNumbers.includes(number))!;

  it('has each run in one row, in the order of the services', () => {
    expect(rows.flatMap(({ runNumbers }) => runNumbers).toSorted()).toEqual(
      data.runs.map(({ number }) => number).toSorted(),
    );
    const order = rows.map(({ serviceId }) => data.services.findIndex(({ id }) => id === serviceId));
    expect(order).toEqual(order.toSorted((one, other) => one - other));
  });

  it('puts together what is insulated alike: steam in the plant room, DN 50 to DN 150', () => {
    const row = rowOf('R19');
    expect(row).toMatchObject({
      runNumbers: ['R42', 'R20', 'R19'],
      sizes: ['DN 50 to DN 150 steel'],
      places: ['Plant room'],
      specificationLabel: 'P01',
      source: 'specified',
      operating: [170],
    });
    expect(wordsText(row.decides, 'SI')).toBe('Energy code not met: 114 mm meets it.');
    expect(row.flags).toBe(4);
    expect(row.section).toMatchObject({ shape: 'cylinder', nature: 'hot', layers: [{ materialId: 'std/mf_pipe' }] });
  });

  it('names both places of one row, and both temperatures of R22 and R23', () => {
    expect(rowOf('R39').places).toEqual(['Concealed ceiling void', 'Crawl space']);
    expect(rowOf('R23')).toMatchObject({ operating: [6, 12], reasons: ['Return main, 12 °C by the chiller schedule'] });
  });

  it('keeps a departure and its reason apart from its row', () => {
    const row = rowOf('R30');
    expect(row).toMatchObject({ source: 'chosen', specificationLabel: 'P02', sizes: ['DN 100 steel'] });
    expect(row.reasons[0]).toContain('Drawing M-401');
    expect(wordsText(row.decides, 'SI')).toBe('Touch not met: 51 mm meets it. Energy code not met: 114 mm meets it.');
  });

  it('names two layers and the copper of refrigerant lines', () => {
    expect(rowOf('R34').layers.map(({ thickness }) => thickness)).toEqual(['in:1.5', 'in:1.5']);
    expect(rowOf('R36').sizes).toEqual(['1 in copper tube']);
  });
});

describe('sizes in few words', () => {
  it('never spans a size that is insulated in another way', async () => {
    const { job, run, row } = await smallJob();
    const runs = ['NPS 1', 'NPS 2', 'NPS 3', 'NPS 4'].map((nominal, place) =>
      run({
        number: `R${place}`,
        shape: steelPipe(nominal),
        override: nominal === 'NPS 3' ? override({ layers: [mineralFibre('in:3')] }) : null,
      }),
    );
    const rows = rowsOf(job({ specification: [row()], runs }));
    expect(rows.map(({ sizes }) => sizes)).toEqual([['DN 25 to DN 50 steel', 'DN 100 steel'], ['DN 80 steel']]);
  });

  it('leaves out what others insulate', async () => {
    const { job, run, row } = await smallJob();
    expect(rowsOf(job({ specification: [row()], runs: [run({ status: 'by-others' })] }))).toEqual([]);
  });
});
