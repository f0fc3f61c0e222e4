import { assert, double, property } from 'fast-check';
import psychrolib from 'psychrolib';

import { dewPoint, saturationPressure, sweatingHumidity } from '@/api/engine/limits/psychrometrics';

// seen in print: BS 5422:1990 as reprinted in the TIASA Thermal Insulation Handbook 2001, Annex 2; printed to 0.1 K,
// and its own reprint has misprints elsewhere, so 0.15 K
const table = {
  10: [0.1, 2.6, 4.8, 6.7, 8.4],
  20: [9.2, 12.0, 14.4, 16.4, 18.3],
  24: [12.9, 15.8, 18.2, 20.3, 22.2],
  30: [18.4, 21.4, 23.9, 26.2, 28.1],
  35: [23.0, 26.0, 28.7, 31.0, 33.1],
  40: [27.6, 30.7, 33.5, 35.9, 38.0],
};
it.each(Object.entries(table))('dew points of air at %s °C, 50 to 90 %', (air, printed) => {
  printed.forEach((value, column) => {
    expect(Math.abs(dewPoint(Number(air), 50 + 10 * column) - value)).toBeLessThan(0.15);
  });
});

// seen in print: ASHRAE Handbook Fundamentals 2021 (SI) ch. 23 Table 5: dry bulb at 90 % for a design dew point
it.each([
  [27.8, 26.1],
  [27.2, 25.6],
  [26.7, 25.0],
  [26.1, 24.4],
  [25.0, 23.3],
  [17.2, 15.6],
])('air at %p °C and 90 %% has its dew point at %p °C', (air, dew) => {
  expect(Math.abs(dewPoint(air, 90) - dew)).toBeLessThan(0.3);
});

// seen in print: ASHRAE Handbook Fundamentals 2021 ch. 1 Table 3
it.each([
  [80, 47.4147],
  [100, 101.418],
  [140, 361.501],
])('water boils at %p °C at %p kPa', (celsius, pressure) => {
  expect(saturationPressure(celsius) / 1000 / pressure).toBeCloseTo(1, 3);
});

it('agrees with psychrolib, a general library of the ASHRAE equations', () => {
  psychrolib.SetUnitSystem(psychrolib.SI);
  const [air, humidity] = [double({ min: -30, max: 60, noNaN: true }), double({ min: 5, max: 100, noNaN: true })];
  assert(
    property(air, humidity, (dryBulb, relative) => {
      expect(dewPoint(dryBulb, relative)).toBeCloseTo(psychrolib.GetTDewPointFromRelHum(dryBulb, relative / 100), 2);
      expect(saturationPressure(dryBulb) / psychrolib.GetSatVapPres(dryBulb)).toBeCloseTo(1, 8);
    }),
  );
});

it('goes back: a surface at the dew point begins to sweat at that humidity', () => {
  const [air, humidity] = [double({ min: -20, max: 50, noNaN: true }), double({ min: 5, max: 99, noNaN: true })];
  assert(
    property(air, humidity, (dryBulb, relative) => {
      expect(sweatingHumidity(dewPoint(dryBulb, relative), dryBulb)).toBeCloseTo(relative, 4);
    }),
  );
});

it('saturated air is at its dew point, and a warm surface never sweats', () => {
  expect(dewPoint(25, 100)).toBeCloseTo(25, 9);
  expect(sweatingHumidity(30, 25)).toBeNull();
});

it.each([0, -5, 101, NaN])('refuses a humidity of %p', (humidity) => {
  expect(() => dewPoint(25, humidity)).toThrow('humidity must be above 0 and at most 100 %');
});
