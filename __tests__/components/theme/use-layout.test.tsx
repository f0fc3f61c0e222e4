import { act, fireEvent, renderHook } from '@testing-library/react';

import { layoutOf, useLayout } from '@/components/theme/use-layout';

it.each([
  [390, 'phone'],
  [719, 'phone'],
  [720, 'wide'],
  [1099, 'wide'],
  [1100, 'split'],
  [1440, 'split'],
])('at %p px it is %s', (width, layout) => {
  expect(layoutOf(width)).toBe(layout);
});

it('changes with the window', () => {
  window.innerWidth = 1440;
  const { result } = renderHook(useLayout);
  expect(result.current).toEqual({ layout: 'split', isPhone: false, isSplit: true });
  window.innerWidth = 390;
  act(() => void fireEvent(window, new Event('resize')));
  expect(result.current).toEqual({ layout: 'phone', isPhone: true, isSplit: false });
  window.innerWidth = 1024;
});
