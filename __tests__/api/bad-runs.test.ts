import { randomUUID } from 'node:crypto';

import type { Quantity } from '@/api/contracts/quantities';

import { newFirm, signedIn } from '../support/firm';
import { newJob, type Agent, type TestJob } from '../support/job';
import { runInput, typed } from '../support/job-inputs';
import { startStack, type Stack } from '../support/stack';

jest.setTimeout(60_000); // hundreds of requests

let stack: Stack;
let agent: Agent;
let made: TestJob;
beforeAll(async () => {
  stack = await startStack();
  agent = await signedIn(stack, await newFirm(stack.services));
  made = await newJob(agent);
});
afterAll(() => stack.stop());

const value = (number: number): Quantity => ({ value: number });
const pipe = { kind: 'pipe', size: { standard: 'asme-steel', nominal: 'NPS 2' }, orientation: 'horizontal' };
const duct = { kind: 'rectangular-duct', width: value(0.6), height: value(0.4), length: value(3) };
const layer = { materialId: 'std/mf_pipe', thickness: 'in:2', installed: null };

type Case = [what: string, change: object, field: string, message: RegExp | string];
const cases: Case[] = [
  ['a length of 0', { shape: { ...pipe, length: value(0) } }, 'shape.length.value', 'Must be more than 0.0 m (0.0 ft)'],
  ['a length below 0', { shape: { ...pipe, length: value(-46) } }, 'shape.length.value', /more than 0/],
  ['a length beyond the earth', { shape: { ...pipe, length: value(1e9) } }, 'shape.length.value', /at most/],
  [
    'a size that its standard has not',
    { shape: { ...pipe, size: { standard: 'asme-steel', nominal: 'DN 51' }, length: value(1) } },
    'shape.size.nominal',
    'Not a size of this standard',
  ],
  [
    'a standard that does not exist',
    { shape: { ...pipe, size: { standard: 'mine', nominal: '2' }, length: value(1) } },
    'shape.size.standard',
    /./,
  ],
  [
    'a pipe wider than a room',
    { shape: { ...pipe, size: { standard: 'other', outsideDiameter: value(21) }, length: value(1) } },
    'shape.size.outsideDiameter.value',
    /at most/,
  ],
  ['a shape that does not exist', { shape: { kind: 'sphere', diameter: value(1) } }, 'shape.kind', /./],
  ['no piece', { shape: { kind: 'piece', count: 0 } }, 'shape.count', 'Must be at least 1'],
  ['half a piece', { shape: { kind: 'piece', count: 1.5 } }, 'shape.count', 'Must be a whole number'],
  ['fittings of another shape', { shape: duct }, 'fittings.elbow-90', 'This shape has no such fitting'],
  ['a fitting that does not exist', { fittings: { wing: 1 } }, 'fittings', /./],
  ['fewer than no fittings', { fittings: { tee: -1 } }, 'fittings.tee', /at least 0/],
  ['on hold without a reason', { status: 'on-hold', hold: null }, 'hold', /names the reason/],
  ['a hold without being on hold', { hold: { reason: 'Why', by: 'Who' } }, 'hold', /names the reason/],
  [
    'an override without a reason',
    { override: { reason: ' ', state: null, layers: null, finishId: null, vapourRetarder: null, codeExempt: '' } },
    'override.reason',
    'Must be filled in',
  ],
  [
    'an override of an unknown finish',
    { override: { reason: 'R', state: null, layers: null, finishId: 'std/x', vapourRetarder: null, codeExempt: '' } },
    'override.finishId',
    /no such finish/,
  ],
  [
    'an override of an unknown material',
    {
      override: {
        reason: 'R',
        state: null,
        layers: [{ ...layer, materialId: 'std/x' }],
        finishId: null,
        vapourRetarder: null,
        codeExempt: '',
      },
    },
    'override.layers.0.materialId',
    /no such material/,
  ],
  ['an unknown service', { serviceId: randomUUID() }, 'serviceId', 'Not a service of this job'],
  ['an unknown place', { placeId: randomUUID() }, 'placeId', 'Not a place of this job'],
  ['an unknown level', { levelId: randomUUID() }, 'levelId', 'Not a level of this job'],
  ['an unknown drawing', { drawingId: randomUUID() }, 'drawingId', 'Not a drawing of this job'],
  ['an id that is none', { id: 'R01' }, 'id', 'Not a known id'],
  ['an elevation out of this world', { elevation: typed('elevation', '2000') }, 'elevation.value', /at most/],
];

it.each(cases)('%s', async (...[, change, field, message]) => {
  const good = { ...runInput(made.where, 'R01'), id: randomUUID(), version: null };
  const bad = { ...runInput(made.where, 'R02'), id: randomUUID(), version: null, ...change };
  const { body } = await agent
    .patch(`${made.path}/runs`)
    .send({ put: [good, bad], drop: [] })
    .expect(400);
  const said = typeof message === 'string' ? message : expect.stringMatching(message);
  expect(body.fields[`put.1.${field}`]).toEqual(said);
  // the good one of the batch is not stored either
  expect((await agent.get(`${made.path}/runs`).expect(200)).body.runs).toEqual([]);
});
