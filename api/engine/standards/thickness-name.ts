import { EngineError } from '../engine-error';

/** A made thickness is named by its series and nominal: in:1.5 is 1-1/2 in, mm:50 is another name than in:2. */
export type ThicknessName = `in:${number}` | `mm:${number}`;

const pattern = /^(in|mm):(\d+(?:\.\d+)?)$/;

export const isThicknessName = (text: string): text is ThicknessName => pattern.test(text);

/** Nominal thickness of a name [m]: inch names x 25.4 mm exactly. */
export function nominalThickness(name: ThicknessName): number {
  const [, unit, number] = pattern.exec(name) ?? [];
  if (!unit || !number) throw new EngineError(`Not a thickness name: ${name}`);
  return Number(number) * (unit === 'in' ? 0.0254 : 0.001);
}

/** How a name is shown on an SI screen: in:1.5 as 38, mm:50 as 50. Only for showing, never compared. */
export const millimetreLabel = (name: ThicknessName): string => {
  const [unit, number] = name.split(':');
  return String(unit === 'in' ? Math.round(Number(number) * 25.4) : Number(number));
};

const fractions = new Map([
  [0.125, '1/8'],
  [0.25, '1/4'],
  [0.375, '3/8'],
  [0.5, '1/2'],
  [0.625, '5/8'],
  [0.75, '3/4'],
  [0.875, '7/8'],
]);

/** How a name is shown on an inch-pound screen: in:1.5 as 1-1/2; a metric name keeps its millimetres. */
export function inchLabel(name: ThicknessName): string {
  const [unit, number] = name.split(':');
  if (unit === 'mm') return `${Number(number)} mm`;
  const [whole, part] = [Math.floor(Number(number)), Number(number) % 1];
  if (part === 0) return String(whole);
  const fraction = fractions.get(part);
  if (!fraction) return String(Number(number));
  return whole ? `${whole}-${fraction}` : fraction;
}
