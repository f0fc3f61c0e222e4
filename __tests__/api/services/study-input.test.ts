import { assemble } from '@/api/services/assembly';
import { caseKey, limitsAt, studyInput } from '@/api/services/study-input';

import { override, smallJob, steelPipe } from '../../support/small-job';

let small: Awaited<ReturnType<typeof smallJob>>;
beforeAll(async () => {
  small = await smallJob();
});

describe('limits of a service at a place', () => {
  it('leaves out a limit of another place', () => {
    const { service, place } = small;
    const chilled = service('Chilled water, flow and return');
    const kinds = (name: string) => limitsAt(chilled, place(name).id).map(({ kind }) => kind);
    expect(kinds('Plant room')).toEqual(['dew-point', 'energy-code', 'material']);
    expect(kinds('Roof, outdoors')).toEqual(['dew-point', 'energy-code', 'material', 'heat-flow']);
  });

  it('puts a limit for this place alone before the one for everywhere', () => {
    const { steam, plantRoom, place } = small;
    const flow = (placeId: string | null, value: number) =>
      ({ kind: 'heat-flow', placeId, perLength: { value }, flux: null }) as const;
    const service = { ...steam, limits: [flow(null, 60), flow(plantRoom.id, 40)] };
    expect(limitsAt(service, plantRoom.id)).toEqual([{ kind: 'heat-flow', perLength: 40, flux: null }]);
    expect(limitsAt(service, place('Service tunnel').id)).toEqual([{ kind: 'heat-flow', perLength: 60, flux: null }]);
  });
});

describe('what the engine is asked', () => {
  const inputOf = (change: Parameters<typeof small.run>[0] = {}) => {
    const { job, run, row } = small;
    const asked = run(change);
    const data = job({ specification: [row()] });
    return studyInput(data, asked, assemble(data, asked)!)!;
  };

  it('is about the standard size with its outside diameter', () => {
    expect(inputOf().body).toEqual({
      shape: 'pipe',
      standard: 'asme-steel',
      nominal: 'NPS 2',
      outsideDiameter: 0.0603,
      orientation: 'horizontal',
      height: null,
    });
  });

  it('gives an upright pipe its length as height', () => {
    const shape = { ...steelPipe('NPS 2', 6), orientation: 'vertical' } as const;
    expect(inputOf({ shape }).body).toMatchObject({ orientation: 'vertical', height: 6 });
  });

  it('takes the temperatures of the override in place of all states of the service', () => {
    const state = {
      nature: 'cold' as const,
      operating: { value: 12 },
      lowest: { value: 10 },
      highest: { value: 15 },
    };
    expect(inputOf({ override: override({ state }) }).states).toEqual([
      { nature: 'cold', operating: 12, lowest: 10, highest: 15 },
    ]);
  });

  it('has one key for two runs that differ only in length, another for another size', () => {
    const key = (change: Parameters<typeof small.run>[0]) => caseKey(inputOf(change), small.plantRoom.id);
    expect(key({ shape: steelPipe('NPS 2', 3) })).toBe(key({ shape: steelPipe('NPS 2', 30) }));
    expect(key({ shape: steelPipe('NPS 2') })).not.toBe(key({ shape: steelPipe('NPS 3') }));
  });

  it('asks nothing about a counted piece', () => {
    const { job, run, row } = small;
    const piece = run({ shape: { kind: 'piece', count: 2 } });
    const data = job({ specification: [row({ appliesTo: 'equipment' })] });
    expect(studyInput(data, piece, assemble(data, piece)!)).toBeNull();
  });
});
