import { act, fireEvent, render, screen } from '@testing-library/react';
import { useState } from 'react';

import { ThicknessStrip } from '@/components/study/thickness-strip';
import { placeAfter } from '@/components/study/strip-keys';

import { Client } from '../../support/client';
import { fakeApi } from '../../support/fake-api';
import { hotSteam } from '../../support/run-study';

beforeEach(() => void fakeApi(() => ({ status: 401, body: {} })));

const standing = { specified: 4, chosen: 2, proposed: 6 };
function Strip() {
  const [selected, setSelected] = useState(6);
  return (
    <Client>
      <ThicknessStrip runStudy={hotSteam} standing={standing} selected={selected} onSelect={setSelected} />
    </Client>
  );
}
const show = () => act(async () => void render(<Strip />));
const checked = () => screen.getByRole('radio', { checked: true });
const press = (key: string) => fireEvent.keyDown(checked(), { key });

it('says each thickness out: name, surface, heat, limits, and which it is', async () => {
  await show();
  expect(screen.getAllByRole('radio').map((one) => one.getAttribute('aria-label'))).toEqual([
    'bare: surface 184.0 °C, 831.9 W/m, fails touch, fails energy code',
    '25 mm: surface 71.1 °C, 84.0 W/m, fails touch, fails energy code',
    '38 mm: surface 63.0 °C, 64.9 W/m, fails touch, fails energy code, chosen',
    '51 mm: surface 58.2 °C, 54.1 W/m, fails energy code',
    '76 mm: surface 52.6 °C, 41.7 W/m, fails energy code, specified',
    '102 mm: surface 49.8 °C, 35.4 W/m, fails energy code',
    '114 mm: surface 48.6 °C, 32.7 W/m, meets all, proposed',
  ]);
});

it('walks with the arrows, jumps to the ends, stops there, and takes the focus along', async () => {
  await show();
  press('ArrowLeft');
  expect(checked().getAttribute('aria-label')).toMatch(/^102 mm/);
  expect(document.activeElement).toBe(checked());
  press('Home');
  expect(checked().getAttribute('aria-label')).toMatch(/^bare/);
  press('ArrowLeft');
  expect(checked().getAttribute('aria-label')).toMatch(/^bare/);
  press('End');
  expect(checked().getAttribute('aria-label')).toMatch(/^114 mm/);
  press('ArrowRight');
  expect(checked().getAttribute('aria-label')).toMatch(/^114 mm/);
});

it('is one stop for the Tab key, and can be tapped', async () => {
  await show();
  fireEvent.click(screen.getByRole('radio', { name: /^38 mm/ }));
  expect(checked().getAttribute('aria-label')).toMatch(/^38 mm/);
  const stops = screen.getAllByRole('radio').filter((one) => one.getAttribute('tabindex') === '0');
  expect(stops).toEqual([checked()]);
});

it('names the limit that is drawn across', async () => {
  await show();
  expect(screen.getByText('touch limit 60 °C')).toBeTruthy();
});

it('leaves other keys to the page', () => {
  expect(placeAfter('Tab', { at: 2, count: 7 })).toBeNull();
  expect(placeAfter('a', { at: 2, count: 7 })).toBeNull();
  expect(placeAfter('End', { at: 0, count: 0 })).toBeNull();
});
