import { randomUUID } from 'node:crypto';

import type { Quantity } from '@/api/contracts/quantities';

import { newFirm, signedIn } from '../support/firm';
import { newJob, type Agent, type TestJob } from '../support/job';
import { buildUpInput, drawingInput, placeInput, serviceInput, specificationInput } from '../support/job-inputs';
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
const { hottest, mostHumid } = placeInput.conditions;
const placeWith = (conditions: object) => ({ name: 'P', conditions: { ...placeInput.conditions, ...conditions } });
const [state] = serviceInput.states;
const layer = { materialId: 'std/mf_pipe', thickness: 'in:2', installed: null };

type Case = [what: string, change: object, field: string, message: RegExp | string];

/** Sends each change of a good input and expects its message at its field, and nothing new in the list. */
function refuses(path: string, good: () => object, cases: Case[]) {
  it.each(cases)(`${path}: %s`, async (...[, change, field, message]) => {
    const list = `${made.path}/${path}`;
    const before = (await agent.get(list).expect(200)).body;
    const { body } = await agent
      .post(list)
      .send({ ...good(), ...change })
      .expect(400);
    expect(body.type).toBe('/problems/invalid-input');
    expect(body.fields[field]).toEqual(typeof message === 'string' ? message : expect.stringMatching(message));
    expect((await agent.get(list).expect(200)).body).toEqual(before);
  });
}

refuses('places', () => placeInput, [
  [
    'humidity 101',
    placeWith({ mostHumid: { ...mostHumid, humidity: value(101) } }),
    'conditions.mostHumid.humidity.value',
    'Must be at most 100%',
  ],
  [
    'humidity 0',
    placeWith({ mostHumid: { ...mostHumid, humidity: value(0) } }),
    'conditions.mostHumid.humidity.value',
    'Must be more than 0%',
  ],
  ['no humidity where it decides', placeWith({ mostHumid: hottest }), 'conditions.mostHumid.humidity', /Must/],
  [
    'air at 4,000 K',
    placeWith({ hottest: { ...hottest, air: value(3726.85) } }),
    'conditions.hottest.air.value',
    'Must be at most 80.0 °C (176.0 °F)',
  ],
  [
    'air below all weather',
    placeWith({ coldest: { ...hottest, air: value(-61) } }),
    'conditions.coldest.air.value',
    /at least −60\.0 °C/,
  ],
  [
    'wind from behind',
    placeWith({ mean: { ...hottest, wind: value(-1) } }),
    'conditions.mean.wind.value',
    /at least 0\.0 m\/s/,
  ],
  [
    'a storm beyond storms',
    placeWith({ mean: { ...hottest, wind: value(61) } }),
    'conditions.mean.wind.value',
    /at most/,
  ],
  [
    'a condition without its source',
    placeWith({ mean: { ...hottest, source: '  ' } }),
    'conditions.mean.source',
    'Must be filled in',
  ],
  [
    'what was typed and the value differ',
    placeWith({ hottest: { ...hottest, air: { value: 40, typed: { text: '41', unit: '°C' } } } }),
    'conditions.hottest.air.typed',
    'What was typed and the value differ',
  ],
  [
    'in reach of the public without a limit',
    { name: 'P', reach: 'public', touchLimit: null },
    'touchLimit',
    /touch limit must be given/,
  ],
  ['a touch limit that burns', { name: 'P', touchLimit: value(101) }, 'touchLimit.value', /at most 100/],
  ['in reach of a stranger', { name: 'P', reach: 'anybody' }, 'reach', /nobody, trained, public/],
  [
    'a duct location that no table has',
    { name: 'P', ductLocation: 'the moon' },
    'ductLocation',
    'No duct table knows this location',
  ],
  ['a name that is taken', {}, 'name', 'Another place of this job has it already'],
]);

refuses('services', () => ({ ...serviceInput, name: 'S' }), [
  ['below absolute zero', { states: [{ ...state, lowest: value(-274) }] }, 'states.0.lowest.value', /at least −200/],
  [
    'lowest above operating',
    { states: [{ ...state, lowest: value(83) }] },
    'states.0.lowest',
    'Must not be above operating',
  ],
  [
    'highest below operating',
    { states: [{ ...state, highest: value(81) }] },
    'states.0.highest',
    'Must not be below operating',
  ],
  ['no state at all', { states: [] }, 'states', /At least 1/],
  ['three states', { states: [state, state, state] }, 'states', /At most 2/],
  ['more hours than a year has', { hours: value(8785) }, 'hours.value', 'Must be at most 8784 h'],
  ['a limit that is not built', { limits: [{ kind: 'freezing', placeId: null }] }, 'limits.0.kind', /./],
  [
    'a negative dew-point margin',
    { limits: [{ kind: 'dew-point', placeId: null, margin: value(-1) }] },
    'limits.0.margin.value',
    /at least/,
  ],
  [
    'a heat-flow limit of nothing',
    { limits: [{ kind: 'heat-flow', placeId: null, perLength: value(0), flux: null }] },
    'limits.0.perLength.value',
    /more than/,
  ],
  [
    'a heat-flow limit without a number',
    { limits: [{ kind: 'heat-flow', placeId: null, perLength: null, flux: null }] },
    'limits.0.perLength',
    /Give a limit/,
  ],
  [
    'one limit twice',
    {
      limits: [
        { kind: 'touch', placeId: null },
        { kind: 'touch', placeId: null },
      ],
    },
    'limits.1.kind',
    /stands here already/,
  ],
  [
    'a limit in an unknown place',
    { limits: [{ kind: 'touch', placeId: randomUUID() }] },
    'limits.0.placeId',
    'Not a place of this job',
  ],
]);

const coverings: Case[] = [
  ['an unknown service', { serviceId: randomUUID() }, 'serviceId', 'Not a service of this job'],
  ['an unknown place', { placeIds: [randomUUID()] }, 'placeIds.0', 'Not known here'],
  ['no layer', { layers: [] }, 'layers', /At least 1/],
  ['four layers', { layers: [layer, layer, layer, layer] }, 'layers', /At most 3/],
  [
    'a material that the library has not',
    { layers: [{ ...layer, materialId: 'std/gold' }] },
    'layers.0.materialId',
    'The library has no such material',
  ],
  [
    'an own material, which no firm has yet',
    { layers: [{ ...layer, materialId: 'own/mf_pipe' }] },
    'layers.0.materialId',
    'The library has no such material',
  ],
  [
    'no library id',
    { layers: [{ ...layer, materialId: '../mf_pipe' }] },
    'layers.0.materialId',
    'Not a row of the library',
  ],
  [
    'a thickness bigger than the room',
    { layers: [{ ...layer, thickness: 'in:120' }] },
    'layers.0.thickness',
    'No series of the library makes this thickness',
  ],
  [
    'millimetres instead of a name',
    { layers: [{ ...layer, thickness: '50' }] },
    'layers.0.thickness',
    'Not a thickness name',
  ],
  ['a name written otherwise', { layers: [{ ...layer, thickness: 'in:2.0' }] }, 'layers.0.thickness', /No series/],
  [
    'an inner layer left open',
    { layers: [{ ...layer, thickness: null }, layer] },
    'layers.0.thickness',
    /Must be chosen/,
  ],
  [
    'a wrap thicker than it is made',
    { layers: [{ ...layer, installed: value(0.06) }] },
    'layers.0.installed',
    /not be more/,
  ],
  ['a wrap of no thickness', { layers: [{ ...layer, installed: value(0) }] }, 'layers.0.installed.value', /more than/],
  ['a finish that the library has not', { finishId: 'std/gold-leaf' }, 'finishId', 'The library has no such finish'],
  ['a bare pipe for a finish', { finishId: 'std/bare-steel' }, 'finishId', /bare surface/],
  ['a vapour retarder that does not exist', { vapourRetarder: 'hope' }, 'vapourRetarder', /Must be one of/],
  ['sizes the wrong way round', { fromDn: 100, toDn: 50 }, 'toDn', /not be smaller/],
];
refuses('build-ups', () => buildUpInput(made.service.id), coverings);
refuses('specification', () => ({ ...specificationInput(made.service.id), label: 'S' }), [
  ...coverings,
  [
    'a layer without its thickness',
    { layers: [{ ...layer, thickness: null }] },
    'layers.0.thickness',
    'Must be chosen',
  ],
]);
refuses('drawings', () => drawingInput, [
  ['a number that is taken', {}, 'number', 'Another drawing of this job has it already'],
  ['the 30th of February', { number: 'D', date: '2026-02-30' }, 'date', 'Must be a date'],
  ['a date before all drawings', { number: 'D', date: '0000-01-01' }, 'date', 'Must be between 1900 and 2199'],
]);
