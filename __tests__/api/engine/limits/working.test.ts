import { wordsText } from '@/api/contracts/words-text';
import { study } from '@/api/engine/limits/study';
import type { StudyInput } from '@/api/engine/limits/study-types';
import { working } from '@/api/engine/limits/working';
import type { Words } from '@/api/engine/words';

import { chilledInput, ductInput, steamInput } from './inputs';

const said = (words: Words) => wordsText(words, 'SI');
const specified = (input: StudyInput) => study(input).specified ?? NaN;
const open = (input: StudyInput, about: Parameters<typeof working>[1]['about']) =>
  working(input, { candidate: specified(input), about });

it('opens the surface: conduction, convection, radiation, balance, each with its values and sources', () => {
  const { steps, engineVersion } = open(steamInput, 'surface');
  expect(steps.map(({ title }) => title)).toEqual(['Conduction, layer 1', 'Convection', 'Radiation', 'Balance']);
  for (const { equation, source } of steps) expect([equation, source].every(Boolean)).toBe(true);
  for (const { inputs } of steps) for (const input of inputs) expect(input.source).not.toBe('');
  expect(engineVersion).toBe(study(steamInput).engineVersion);
});

/** The numbers of a sentence, in their order. */
const numbers = (words: Words) =>
  words.flatMap((part) => (typeof part === 'object' && 'value' in part ? [part.value] : []));
const product = (words: Words) =>
  numbers(words)
    .slice(0, 2)
    .reduce((one, other) => one * other, 1);

it('puts in values that give the result when a reader recomputes them', () => {
  const { steps } = open(steamInput, 'surface');
  const conduction = steps[0]?.filled ?? [];
  const [outer, inner] = numbers(conduction).slice(2);
  const conducted = (2 * Math.PI * product(conduction)) / Math.log(Number(outer) / Number(inner));
  expect(conducted).toBeCloseTo(Number(numbers(steps[0]?.result ?? [])[0]), 6);
  const balance = steps[3]?.filled ?? [];
  expect(product(balance)).toBeCloseTo(Number(numbers(balance)[2]), 6);
});

it.each(['touch', 'energy-code', 'material'] as const)('opens %s of a hot service', (about) => {
  const { steps } = open(steamInput, about);
  expect(steps.length).toBeGreaterThan(0);
  expect(steps.at(-1)?.source).not.toBe('');
});

it('opens touch at its own conditions, and ends with the verdict', () => {
  const steps = open(steamInput, 'touch').steps;
  expect(said(steps.at(-1)?.result ?? [])).toMatch(/^not met, margin −\d/);
  expect(said(steps[0]?.inputs[0]?.value ?? [])).toBe('184.00 °C');
});

it('opens the dew point with its psychrometrics', () => {
  const titles = open(chilledInput, 'dew-point').steps.map(({ title }) => title);
  expect(titles.slice(-2)).toEqual(['Dew point of the air', 'Dew point limit']);
});

it('opens the adjustment of a pipe table and the R of a duct table', () => {
  expect(open(chilledInput, 'energy-code').steps[0]?.equation).toContain('nominal thickness at least t');
  expect(open(ductInput, 'energy-code').steps[0]?.equation).toContain('R = Σ t / k');
});

it('opens a bare surface, and a heat-flow limit', () => {
  expect(working(steamInput, { candidate: 0, about: 'surface' }).steps[0]?.title).toBe('Convection');
  const limited: StudyInput = { ...steamInput, limits: [{ kind: 'heat-flow', perLength: 60, flux: null }] };
  expect(open(limited, 'heat-flow').steps.at(-1)?.title).toBe('Heat-flow limit');
  expect(open(steamInput, 'heat-flow').title).toContain('Heat flow, operating');
});

it('says why a limit does not apply', () => {
  const { steps } = open({ ...steamInput, codeExempt: 'it belongs to rated equipment' }, 'energy-code');
  expect(steps.map(({ filled, result }) => [said(filled), said(result)])).toEqual([
    ['it belongs to rated equipment', 'does not apply'],
  ]);
});

it('refuses what the study has not', () => {
  expect(() => working(steamInput, { candidate: 99, about: 'surface' })).toThrow('no candidate 99');
  expect(() => open(steamInput, 'dew-point')).toThrow('no limit dew-point');
});
