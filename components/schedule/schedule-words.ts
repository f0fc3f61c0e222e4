import type { UnitSystem } from '@/api/contracts/quantities';
import { limitWords } from '@/api/contracts/run-words';
import type { ScheduleRow } from '@/api/contracts/schedule';
import { thicknessText, wordsText } from '@/api/contracts/words-text';

/** Names of the layers from the inside out: "64 + 51 mm"; nothing where nothing made meets all. */
export function layersText({ layers }: Pick<ScheduleRow, 'layers'>, units: UnitSystem): string {
  const names = layers.flatMap(({ thickness }) => thickness ?? []);
  return names.length === layers.length ? thicknessText(names, units) : 'none made';
}

/** One material, or each of several from the inside out. */
export const materialText = ({ layers }: Pick<ScheduleRow, 'layers'>): string =>
  [...new Set(layers.map(({ material }) => material))].join(', then ');

export const sourceWords: Record<ScheduleRow['source'], string> = {
  chosen: 'chosen',
  specified: 'specification',
  proposed: 'proposed',
};

/** "specification P02", "chosen: drawing M-401 note 4 shows 38 mm". */
export function fromText({ source, specificationLabel, reasons }: ScheduleRow): string {
  if (source === 'chosen') return `chosen: ${reasons.join('; ')}`;
  return source === 'specified' && specificationLabel ? `specification ${specificationLabel}` : sourceWords[source];
}

/** What decides the thickness, or falls short, in the reader's units. */
export function decidesText({ decides, governing }: ScheduleRow, units: UnitSystem): string {
  const words = wordsText(decides, units);
  return words || (governing ? limitWords[governing] : '');
}

export const retarderWords: Record<ScheduleRow['vapourRetarder'], string> = {
  none: '',
  'sealed-facing': 'facing sealed at laps, joints, fittings and ends',
  'closed-cell': 'every joint glued or sealed',
  'mastic-and-mesh': 'vapour-retarder mastic with mesh',
};
