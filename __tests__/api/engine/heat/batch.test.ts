import { answerBatch } from '@/api/engine/heat/batch';

const good = {
  shape: 'vertical-flat',
  height: 1,
  layers: [{ thickness: 0.05, conductivity: [[0, 0.034]] }],
  operatingTemperature: 80,
  airTemperature: 20,
  emittance: 0.9,
  surface: 'astm-c680',
};

it('answers each case in its place, the wrong ones by what is wrong', () => {
  const { answers, failed } = answerBatch([good, { ...good, emittance: 2 }, { ...good, colour: 'white' }, null, good]);
  expect(failed).toBe(3);
  expect(answers).toHaveLength(5);
  expect(answers[0]).toEqual(answers[4]);
  expect(answers[0]).toHaveProperty('heatFlow');
  expect(answers.slice(1, 4)).toEqual([
    { error: 'emittance must be above 0 and at most 1, got 2' },
    { error: 'case has an unknown key: colour' },
    { error: 'case must be an object, got null' },
  ]);
});

it.each([
  [{ ...good, airTemperature: '20' }, 'airTemperature must be a number, got "20"'],
  [{ ...good, operatingTemperature: undefined }, 'operatingTemperature is missing'],
  [{ ...good, layers: {} }, 'layers must be a list, got {}'],
  [
    { ...good, layers: [{ thickness: 0.05, conductivity: [[0]] }] },
    'layers[0].conductivity: a point is [mean °C, W/(m·K)], got [0]',
  ],
  [
    { ...good, layers: [{ thickness: 0.05, conductivity: [[0, 0.04]], name: 'x' }] },
    'layers[0] has an unknown key: name',
  ],
  [{ ...good, surface: { coefficient: 9, wind: 1 } }, 'surface has an unknown key: wind'],
  [{ ...good, shape: 'cube' }, 'shape must be one of'],
])('says what is wrong: %j', (wrong, message) => {
  expect(answerBatch([wrong]).answers[0]).toEqual({ error: expect.stringContaining(message) });
});

it('wants an array', () => expect(() => answerBatch({ cases: [] })).toThrow('must be an array of cases'));
