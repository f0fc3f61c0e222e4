import { airText, degreesText, situationText, touchText } from '@/components/place/place-words';

const air = (value: number, rest: { humidity?: number; wind?: number } = {}) => ({
  air: { value },
  humidity: rest.humidity === undefined ? null : { value: rest.humidity },
  wind: { value: rest.wind ?? 0 },
  source: 'Measured',
});

describe('air', () => {
  // °F = 1.8 °C + 32 and 1 mph = 0.44704 m/s, by definition
  it('reads in the units of the reader, with what was given and nothing else', () => {
    expect(airText(air(32), 'SI')).toBe('32 °C');
    expect(airText(air(28, { humidity: 75 }), 'SI')).toBe('28 °C at 75%');
    expect(airText(air(-12, { wind: 6 }), 'SI')).toBe('−12 °C, wind 6 m/s');
    expect(airText(air(-12, { wind: 6 }), 'IP')).toBe('10.4 °F, wind 13.4 mph');
    expect(airText(air(30), 'IP')).toBe('86 °F');
  });
});

it('says who reaches a surface, how hot it may get, and when nobody said so', () => {
  expect(touchText({ reach: 'trained', touchLimit: { value: 60 } }, 'SI')).toBe('Trained people, 60 °C');
  expect(touchText({ reach: 'trained', touchLimit: { value: 60 } }, 'IP')).toBe('Trained people, 140 °F');
  expect(touchText({ reach: 'trained', touchLimit: null }, 'SI')).toBe('Trained people, no touch limit');
  expect(touchText({ reach: 'nobody', touchLimit: null }, 'SI')).toBe('Out of reach');
});

it('keeps a decimal only where there is one', () => {
  expect(degreesText(60, 'SI')).toBe('60 °C');
  expect(degreesText(37.8, 'SI')).toBe('37.8 °C');
  expect(degreesText(37.8, 'IP')).toBe('100 °F');
});

it('names an air plenum', () => {
  expect(situationText({ outdoor: false, plenum: true })).toBe('indoors, air plenum');
  expect(situationText({ outdoor: true, plenum: false })).toBe('outdoors');
});
