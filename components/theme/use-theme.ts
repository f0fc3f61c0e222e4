import { createContext, useContext } from 'react';

import { light, type Colours } from './tokens';

export type Scheme = 'light' | 'night';
export type Theme = Colours & { scheme: Scheme };

export const ThemeContext = createContext<Theme>({ ...light, scheme: 'light' });

/** The colours in force: they follow the system unless this device has pinned them. */
export const useTheme = (): Theme => useContext(ThemeContext);
