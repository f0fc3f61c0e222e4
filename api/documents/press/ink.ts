/** The light tokens of the look, on paper; every state has a word beside its colour, so black and white tells as much. */
export const ink = {
  text: '#1B242D',
  soft: '#54606B',
  rule: '#D8D2C6',
  oxide: '#9E3A1C',
  hot: '#B04A1B',
  cold: '#1D6479',
  fail: '#A5231C',
  wash: '#F6F3EC',
  sheet: '#FFFFFF',
} as const;

/** A4 in points; `body` is what a part of the document may fill. */
export const page = { width: 595.28, height: 841.89 } as const;
export const body = {
  left: 48,
  right: page.width - 48,
  top: 104,
  bottom: page.height - 66,
  width: page.width - 96,
} as const;

export type FontName = 'regular' | 'semibold' | 'bold';
export type Style = { font: FontName; size: number; leading: number; colour: string };

const style = (font: FontName, [size, leading]: [number, number], colour: string = ink.text): Style => ({
  font,
  size,
  leading,
  colour,
});

export const styles = {
  title: style('semibold', [25, 30]),
  heading: style('semibold', [18, 23]),
  subheading: style('semibold', [11.5, 16]),
  lead: style('regular', [11.5, 16.5]),
  body: style('regular', [9.5, 13.5]),
  bodySoft: style('regular', [9.5, 13.5], ink.soft),
  bodyStrong: style('semibold', [9.5, 13.5]),
  cell: style('regular', [9, 12]),
  cellStrong: style('semibold', [9, 12]),
  cellSoft: style('regular', [8.5, 11.5], ink.soft),
  cellLink: style('regular', [8.5, 11.5], ink.oxide),
  head: style('semibold', [8.25, 11], ink.soft),
  note: style('regular', [8, 11], ink.soft),
  noteStrong: style('semibold', [8, 11], ink.soft),
  thickness: style('bold', [13, 15]),
  figure: style('bold', [21, 25]),
} as const satisfies Record<string, Style>;
