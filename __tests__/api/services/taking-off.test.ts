import type { JobData } from '@/api/contracts/job-data';
import type { Takeoff } from '@/api/contracts/schedule';
import { judge } from '@/api/services/judging';
import { takeoffOf } from '@/api/services/taking-off';
import { demoInMemory } from '@/db/seeds/demo/in-memory';

import expected from './demo/expected-checks.json';
import { override, smallJob, steelPipe } from '../../support/small-job';

const takeoff = (data: JobData): Takeoff => takeoffOf(data, judge(data));
const total = (lines: Takeoff['lines'], of: 'length' | 'area' | 'count') =>
  lines.reduce((sum, line) => sum + (line[of] ?? 0), 0);

describe('the invented demo job', () => {
  let data: JobData;
  beforeAll(async () => {
    data = await demoInMemory('addendum-1');
  });

  it.each([
    ['Level 1, ward ceilings', 802],
    ['Level 2, plant room', 672.5],
    ['Level 3, tunnel, roof and crawl space', 822],
  ])('has on %s %p m of pipe', (name, metres) => {
    const level = data.levels.find((candidate) => candidate.name === name)!;
    const runs = data.runs.filter(({ levelId }) => levelId === level.id);
    const pipes = takeoff({ ...data, runs }).lines.filter(({ appliesTo }) => appliesTo === 'pipe');
    expect(total(pipes, 'length')).toBeCloseTo(metres, 9);
  });

  it('has finished areas by made outside diameters: π D L of each run', () => {
    const diameters = new Map(
      Object.entries(expected.runs).map(([number, checks]) => [
        number,
        'outsideDiameter' in checks ? checks.outsideDiameter : 0,
      ]),
    );
    const wanted = data.runs.flatMap(({ number, shape }) =>
      shape.kind === 'pipe' ? [Math.PI * diameters.get(number)! * shape.length.value] : [],
    );
    const pipes = takeoff(data).lines.filter(({ appliesTo }) => appliesTo === 'pipe');
    // diameters there are rounded to 0.1 mm
    expect(total(pipes, 'area') / wanted.reduce((sum, area) => sum + area, 0)).toBeCloseTo(1, 3);
  });

  it('has 21.00 m² of equipment, two pump bodies as 2.20 m²', () => {
    const equipment = takeoff(data).lines.filter(({ appliesTo }) => appliesTo === 'equipment');
    expect(total(equipment, 'area')).toBeCloseTo(9.13 + 7.07 + 2.2 + 2.6, 2);
    expect(equipment.find(({ count }) => count === 2)?.area).toBeCloseTo(2.2, 9);
  });

  it('has the board of D04 and D06 at P + 8t', () => {
    const line = (number: string) => takeoff(data).lines.find(({ runNumbers }) => runNumbers.includes(number))!;
    expect(line('D04').area).toBeCloseTo(3.4064 * 16, 4);
    expect(line('D06').area).toBeCloseTo(2.7048 * 9, 4);
  });

  it('counts each measured thing once', () => {
    const { lines, fittings, onHold, byOthers } = takeoff(data);
    expect(lines.flatMap(({ runNumbers }) => runNumbers).toSorted()).toEqual(
      data.runs.map(({ number }) => number).toSorted(),
    );
    const elbows = data.runs.reduce((sum, run) => sum + (run.fittings['elbow-90'] ?? 0), 0);
    expect(fittings.find(({ kind }) => kind === 'elbow-90')?.count).toBe(elbows);
    expect(onHold).toEqual(['R42']);
    expect(byOthers).toEqual([]);
  });

  it('puts twins of one size and thickness in one line', () => {
    const line = takeoff(data).lines.find(({ runNumbers }) => runNumbers.includes('R32'))!;
    expect(line).toMatchObject({ runNumbers: ['R32', 'R33'], size: 'DN 150 steel', length: 128, names: ['in:2'] });
  });
});

describe('what is counted', () => {
  it('leaves out what others insulate, and names it', async () => {
    const { job, run, row } = await smallJob();
    const runs = [run({ number: 'R1' }), run({ number: 'R2', status: 'by-others' })];
    const { lines, byOthers } = takeoff(job({ specification: [row()], runs }));
    expect(total(lines, 'length')).toBe(10);
    expect(byOthers).toEqual(['R2']);
  });

  it('keeps the metres of a run that nothing says how to insulate, without an area', async () => {
    const { job, run } = await smallJob();
    const { lines } = takeoff(job({ runs: [run()] }));
    expect(lines).toMatchObject([{ length: 10, area: null, names: [], material: 'Not specified' }]);
  });

  it('parts a size by finish and by thickness', async () => {
    const { job, run, row } = await smallJob();
    const runs = [
      run({ number: 'R1' }),
      run({ number: 'R2', override: override({ finishId: 'std/pvc-jacket' }) }),
      run({ number: 'R3', shape: steelPipe('NPS 2', 5) }),
    ];
    const { lines } = takeoff(job({ specification: [row()], runs }));
    expect(lines.map(({ runNumbers, length }) => [runNumbers, length])).toEqual([
      [['R1', 'R3'], 15],
      [['R2'], 10],
    ]);
  });
});
