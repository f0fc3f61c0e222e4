/** Raw colours and sizes live here and nowhere else. */
export type Colours = {
  paper: string;
  sheet: string;
  ink: string;
  inkSoft: string;
  rule: string;
  oxide: string;
  onAction: string;
  hot: string;
  cold: string;
  pass: string;
  caution: string;
  fail: string;
};
export type ColourName = keyof Colours;

export const light: Colours = {
  paper: '#F6F3EC',
  sheet: '#FFFFFF',
  ink: '#1B242D',
  inkSoft: '#54606B',
  rule: '#D8D2C6',
  oxide: '#9E3A1C',
  onAction: '#FFFFFF',
  hot: '#B04A1B',
  cold: '#1D6479',
  pass: '#2C6E49',
  caution: '#8A5A00',
  fail: '#A5231C',
};

/** For basements, and roofs at dawn. */
export const night: Colours = {
  paper: '#11161B',
  sheet: '#1A2128',
  ink: '#EEF1F3',
  inkSoft: '#A9B4BD',
  rule: '#2E3740',
  oxide: '#E58A66',
  onAction: '#11161B',
  hot: '#F0A070',
  cold: '#7CC4D8',
  pass: '#7FCB9F',
  caution: '#E8B949',
  fail: '#F28B82',
};

/** Steps of the 4-pt grid. */
export const space = { xxs: 4, xs: 8, sm: 12, md: 16, lg: 24, xl: 32, xxl: 48 } as const;
export type Space = keyof typeof space;

export const radius = { sm: 4, md: 10 } as const;
export const hairline = 1;

/** Type by what it is for, with the line it stands on. */
export const type = {
  small: { fontSize: 13, lineHeight: 18 },
  body: { fontSize: 15, lineHeight: 22 },
  lead: { fontSize: 17, lineHeight: 25 },
  sentence: { fontSize: 21, lineHeight: 30 },
  title: { fontSize: 28, lineHeight: 34 },
  figure: { fontSize: 40, lineHeight: 46 },
} as const;
export type TypeSize = keyof typeof type;

export const weight = { regular: '400', strong: '600', bold: '700' } as const;
export type Weight = keyof typeof weight;
export const fontFamily = '"Source Sans 3", "Segoe UI", system-ui, sans-serif';

/** The smallest side of whatever can be pressed: in the office, and with gloves on. */
export const touchTarget = 44;
export const fieldTarget = 56;

/** Widths from which a layout begins. */
export const breakpoint = { wide: 720, split: 1100 } as const;
export const railWidth = 196;
/** The widest that running text and forms get. */
export const measure = 720;
