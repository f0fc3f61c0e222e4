import { assemble } from '@/api/services/assembly';

import { mineralFibre, override, smallJob, steelPipe } from '../../support/small-job';

type Small = Awaited<ReturnType<typeof smallJob>>;
let small: Small;
beforeAll(async () => {
  small = await smallJob();
});

const other = { kind: 'pipe', size: { standard: 'other', outsideDiameter: { value: 0.0603 } } } as const;

describe('which row of the specification a run takes', () => {
  it('takes the row of its service, body, place and size band', () => {
    const { job, run, row, place, service, plantRoom } = small;
    const rows = [
      row({ label: 'another service', serviceId: service('Chilled water, flow and return').id }),
      row({ label: 'another body', appliesTo: 'duct' }),
      row({ label: 'another place', placeIds: [place('Service tunnel').id] }),
      row({ label: 'smaller sizes', toDn: 40 }),
      row({ label: 'larger sizes', fromDn: 65 }),
      row({ label: 'this one', placeIds: [plantRoom.id], fromDn: 50, toDn: 50 }),
    ];
    expect(assemble(job({ specification: rows }), run())?.row?.label).toBe('this one');
  });

  it('takes named places before all places, whatever the bands', () => {
    const { job, run, row, plantRoom } = small;
    const rows = [
      row({ label: 'everywhere', fromDn: 50, toDn: 50 }),
      row({ label: 'named place', placeIds: [plantRoom.id], fromDn: 15, toDn: 200 }),
    ];
    expect(assemble(job({ specification: rows }), run())?.row?.label).toBe('named place');
  });

  it('takes the narrower band before the wider, an open one before none', () => {
    const { job, run, row } = small;
    const wide = row({ label: 'wide', fromDn: 15, toDn: 200 });
    const narrow = row({ label: 'narrow', fromDn: 40, toDn: 80 });
    const open = row({ label: 'open', fromDn: 40 });
    const every = row({ label: 'every size' });
    const taken = (...specification: ReturnType<Small['row']>[]) => assemble(job({ specification }), run())?.row?.label;
    expect(taken(every, open, wide, narrow)).toBe('narrow');
    expect(taken(every, open, wide)).toBe('wide');
    expect(taken(every, open)).toBe('open');
  });

  it('takes the first of two rows that are alike', () => {
    const { job, run, row } = small;
    const rows = [row({ label: 'first' }), row({ label: 'second' })];
    expect(assemble(job({ specification: rows }), run())?.row?.label).toBe('first');
  });

  it('gives a free diameter only a row without a band', () => {
    const { job, run, row } = small;
    const free = run({ shape: { ...other, length: { value: 4 }, orientation: 'horizontal' } });
    const banded = row({ label: 'banded', fromDn: 0, toDn: 5000 });
    expect(assemble(job({ specification: [banded] }), free)).toBeNull();
    expect(assemble(job({ specification: [banded, row({ label: 'plain' })] }), free)?.row?.label).toBe('plain');
  });

  it('bands by DN, not by millimetres: NPS 2-1/2 is DN 65 though 73 mm across', () => {
    const { job, run, row } = small;
    const rows = [row({ label: 'to DN 65', toDn: 65 }), row({ label: 'from DN 80', fromDn: 80 })];
    expect(assemble(job({ specification: rows }), run({ shape: steelPipe('NPS 2-1/2') }))?.row?.label).toBe('to DN 65');
  });
});

describe('chosen over specified over proposed', () => {
  it('leaves the thickness to the study where only a build-up fits', () => {
    const { job, run, buildUp } = small;
    const assembled = assemble(job({ buildUps: [buildUp()] }), run());
    expect(assembled).toMatchObject({ source: 'proposed', row: null, layers: [mineralFibre(null)] });
  });

  it('puts a specification row before a build-up', () => {
    const { job, run, row, buildUp } = small;
    const assembled = assemble(job({ specification: [row()], buildUps: [buildUp()] }), run());
    expect(assembled).toMatchObject({ source: 'specified', layers: [mineralFibre('in:2')] });
  });

  it('keeps the layers of the row when only the finish is overridden', () => {
    const { job, run, row } = small;
    const changed = run({ override: override({ finishId: 'std/pvc-jacket' }) });
    expect(assemble(job({ specification: [row()] }), changed)).toMatchObject({
      source: 'chosen',
      finishId: 'std/pvc-jacket',
      layers: [mineralFibre('in:2')],
      reason: 'The drawing says so',
      row: { label: 'S1' },
    });
  });

  it('keeps finish and retarder of the row when only the layers are overridden', () => {
    const { job, run, row } = small;
    const changed = run({ override: override({ layers: [mineralFibre('in:1.5')] }) });
    expect(assemble(job({ specification: [row()] }), changed)).toMatchObject({
      source: 'chosen',
      finishId: 'std/aluminium-sheet',
      layers: [mineralFibre('in:1.5')],
    });
  });

  it('stays specified when only the temperatures are overridden, and keeps the reason', () => {
    const { job, run, row, steam } = small;
    const cooler = run({ override: override({ state: steam.states[0]! }) });
    expect(assemble(job({ specification: [row()] }), cooler)).toMatchObject({
      source: 'specified',
      reason: 'The drawing says so',
    });
  });

  it('exempts from the code row by the run before the service', () => {
    const { job, run, row, service } = small;
    const cold = service('Domestic cold water');
    const specification = [row({ serviceId: cold.id })];
    const exempt = (codeExempt: string) =>
      assemble(job({ specification }), run({ serviceId: cold.id, override: override({ codeExempt }) }))?.codeExempt;
    expect(exempt('')).toBe('the fluid is neither heated nor cooled with fuel or electricity');
    expect(exempt('inside a partition')).toBe('inside a partition');
  });

  it('says nothing where nothing says how to insulate the run', () => {
    const { job, run } = small;
    expect(assemble(job({}), run())).toBeNull();
    expect(assemble(job({}), run({ override: override({ layers: [mineralFibre('in:2')] }) }))).toBeNull();
  });
});
