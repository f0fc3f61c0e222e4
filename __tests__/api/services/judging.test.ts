import type { JobData } from '@/api/contracts/job-data';
import { wordsText } from '@/api/contracts/words-text';
import { judge, judgementOf } from '@/api/services/judging';

import { mineralFibre, override, smallJob, steelPipe } from '../../support/small-job';

type Small = Awaited<ReturnType<typeof smallJob>>;
let small: Small;
beforeAll(async () => {
  small = await smallJob();
});

const judged = (data: JobData) => judgementOf(judge(data)).runs;
const flagTexts = (data: JobData) =>
  judged(data).map(({ flags }) => flags.map(({ kind, words }) => [kind, wordsText(words, 'SI')]));

describe('a run without anything specified', () => {
  it('gets the thinnest that meets every limit of its build-up, and no flag', () => {
    const { job, run, buildUp } = small;
    const [answer] = judged(job({ buildUps: [buildUp()], runs: [run()] }));
    // the code row entered asks 4-1/2 in for DN 50 steam at 170 °C
    expect(answer).toMatchObject({ names: ['in:4.5'], governing: 'energy-code', flags: [] });
    expect(answer!.assembly).toMatchObject({ source: 'proposed', specificationLabel: null });
    expect(answer!.assembly!.layers[0]!.thickness).toBe('in:4.5');
  });

  it('is a flag where no build-up fits either', () => {
    const { job, run } = small;
    expect(flagTexts(job({ runs: [run()] }))).toEqual([
      [['not-specified', 'No row of the specification and no build-up fits this run.']],
    ]);
  });

  it('is flagged by the limit that nothing made meets, and nothing is put up', () => {
    const { job, run, buildUp, place, steam } = small;
    const corridor = place('Exposed ward corridor');
    const tight = {
      ...steam,
      limits: [{ kind: 'heat-flow', placeId: null, perLength: { value: 1 }, flux: null } as const],
    };
    const data = job({
      services: [tight],
      buildUps: [buildUp()],
      runs: [run({ placeId: corridor.id })],
    });
    const [answer] = judged(data);
    expect(answer).toMatchObject({ names: [], surface: null, heatFlow: null });
    expect(answer!.flags).toHaveLength(1);
    expect(flagTexts(data)[0]![0]![1]).toMatch(
      /^\d+ mm: Heat flow \d+\.\d W\/m, limit 1(\.0)? W\/m\. No made thickness with this finish meets it\.$/,
    );
  });
});

describe('words of a flag', () => {
  it('say surface, limit and what meets it', () => {
    const { job, run, row, place } = small;
    const tunnel = place('Service tunnel');
    const touchOnly = { ...small.steam, limits: [{ kind: 'touch', placeId: null } as const] };
    const data = job({
      services: [touchOnly],
      specification: [row({ layers: [mineralFibre('in:1.5')] })],
      runs: [run({ placeId: tunnel.id, shape: steelPipe('NPS 4') })],
    });
    // R30 of the invented demo, there 63.11 °C within 0.2 K
    expect(flagTexts(data)[0]![0]![1]).toMatch(/^Surface 63\.[01] °C, limit 60 °C\. 51 mm meets it\.$/);
  });

  it('say who placed a hold and why, for a run that is otherwise right', () => {
    const { job, run, row, service } = small;
    const heating = service('Heating water, flow');
    const data = job({
      specification: [row({ serviceId: heating.id })],
      runs: [run({ serviceId: heating.id, status: 'on-hold', hold: { reason: 'Old lagging', by: 'A. Person' } })],
    });
    expect(flagTexts(data)).toEqual([[['hold', 'On hold: Old lagging (A. Person).']]]);
  });

  it('never promise more than was worked out', () => {
    const texts = judged({ ...small.demo }).flatMap(({ flags }) => flags.map(({ words }) => wordsText(words, 'SI')));
    expect(texts.length).toBeGreaterThan(10);
    expect(texts.filter((text) => /\b(safe|complies|guarantee)/i.test(text))).toEqual([]);
  });
});

describe('a run that cannot be calculated', () => {
  it('says why and lets the others go on', () => {
    const { job, run, row } = small;
    const runs = [run({ number: 'R1', shape: steelPipe('NPS 2000') }), run({ number: 'R2' })];
    const [broken, whole] = judged(job({ specification: [row()], runs }));
    expect(broken).toMatchObject({
      problem: 'NPS 2000 is no size of its standard',
      verdicts: [],
      flags: [{ kind: 'not-calculated' }],
    });
    expect(whole).toMatchObject({ problem: null, names: ['in:2'] });
  });
});

describe('a dual-temperature service', () => {
  it('is judged in both states, and one flag says the worse', () => {
    const { job, run, row, service, place } = small;
    const chilled = service('Chilled water, flow and return');
    const hot = service('Heating water, flow');
    const dual = {
      ...chilled,
      states: [hot.states[0]!, chilled.states[0]!],
      limits: [...hot.limits, ...chilled.limits.filter(({ kind }) => kind === 'dew-point')],
    };
    const data = job({
      services: [dual],
      specification: [
        row({
          serviceId: dual.id,
          finishId: 'std/all-service-jacket',
          vapourRetarder: 'sealed-facing',
          layers: [mineralFibre('in:1')],
        }),
      ],
      runs: [run({ serviceId: dual.id, placeId: place('Crawl space').id })],
    });
    const [answer] = judged(data);
    const kinds = answer!.verdicts.map(({ kind }) => kind);
    expect(kinds).toEqual(expect.arrayContaining(['touch', 'dew-point']));
    expect(answer!.flags.filter(({ kind }) => kind === 'dew-point')).toHaveLength(1);
    expect(answer!.flags.filter(({ kind }) => kind === 'touch')).toHaveLength(0);
  });
});

describe('equal cases', () => {
  it('are solved once and share one study', () => {
    const { job, run, row } = small;
    const runs = [
      run({ shape: steelPipe('NPS 2', 3) }),
      run({ shape: steelPipe('NPS 2', 30) }),
      run({ override: override({}) }),
    ];
    const [one, other, same] = judge(job({ specification: [row()], runs }));
    expect(one!.study).toBe(other!.study);
    expect(one!.study).toBe(same!.study);
  });
});
