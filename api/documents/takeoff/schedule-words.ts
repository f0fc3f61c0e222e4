import type { ScheduleRow } from '@/api/contracts/schedule';
import type { VapourRetarder } from '@/api/engine/standards/rows';
import { inchLabel, millimetreLabel, type ThicknessName } from '@/api/engine/standards/thickness-name';

const namesOf = ({ layers }: Pick<ScheduleRow, 'layers'>): ThicknessName[] =>
  layers.flatMap(({ thickness }) => thickness ?? []);

/** Layers from the inside out, in millimetres. */
export const thicknessOf = (row: Pick<ScheduleRow, 'layers'>): string =>
  namesOf(row).map(millimetreLabel).join(' + ') || '–';

/** The same by the trade's inch names, where it has them. */
export function inchesOf(row: Pick<ScheduleRow, 'layers'>): string {
  const names = namesOf(row);
  return names.length > 0 && names.every((name) => name.startsWith('in:'))
    ? `${names.map(inchLabel).join(' + ')} in`
    : '';
}

/** Two lines under a drawing: the sizes, and with how much they are insulated. */
export const sizesAndThickness = (row: ScheduleRow): string => `${row.sizes[0] ?? ''}\n${thicknessOf(row)} mm`;

export const retarderWords: Record<VapourRetarder, string> = {
  none: '',
  'sealed-facing': 'facing and laps sealed',
  'closed-cell': 'every joint sealed',
  'mastic-and-mesh': 'mastic with mesh',
};

/** Who says so: the specification's row, an override with its reason, or the calculation. */
export function sourceWords({
  source,
  specificationLabel,
}: Pick<ScheduleRow, 'source' | 'specificationLabel'>): string {
  if (source === 'specified') return ['specification', specificationLabel].filter(Boolean).join(' ');
  if (source === 'chosen')
    return ['chosen', specificationLabel && `instead of ${specificationLabel}`].filter(Boolean).join(' ');
  return 'proposed here';
}

/** A material or finish without what its standard adds in brackets; the list of standards has the whole name. */
export const shortName = (name: string): string => name.replace(/\s*\([^()]*\)/g, '').trim() || name;
