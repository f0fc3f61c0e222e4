import { limitsText, natureText, operatingText, rangeText } from '@/components/service/service-words';

const state = (nature: 'hot' | 'cold', [lowest, operating, highest]: [number, number, number]) => ({
  nature,
  lowest: { value: lowest },
  operating: { value: operating },
  highest: { value: highest },
});
const places = [{ id: 'roof', name: 'Roof, outdoors' }];

it('reads both states of a service that is hot in winter and cold in summer', () => {
  const states = [state('hot', [60, 80, 90]), state('cold', [5, 7, 15])];
  expect(natureText(states)).toBe('hot and cold');
  expect(operatingText(states, 'SI')).toBe('80 °C / 7 °C');
  expect(rangeText(states[1]!, 'IP')).toBe('41 °F to 59 °F');
});

it('lists the limits that hold everywhere, then those of one place', () => {
  const limits = [
    { kind: 'dew-point', placeId: null, margin: { value: 1 } } as const,
    { kind: 'material', placeId: null } as const,
    { kind: 'heat-flow', placeId: 'roof', perLength: { value: 20 }, flux: null } as const,
  ];
  expect(limitsText({ limits }, places, 'SI')).toBe('dew point + 1 K, material; heat flow 20 W/m in Roof, outdoors');
  expect(limitsText({ limits: [] }, places, 'SI')).toBe('no limit');
});
