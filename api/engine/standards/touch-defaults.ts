import type { Origin } from './rows';
import table from './tables/touch.json';

/** A starting value for a place's touch limit [°C]; the project decides, and the limit names its source. */
export type TouchDefault = Origin & { id: string; where: string; limit: number; basis: string };
/** A burn threshold [°C] by what is touched and for how long. */
export type TouchThreshold = { surface: string; contact: string; limit: number };

export const touchDefaults = (): readonly TouchDefault[] => table.defaults;
export const touchThresholds = (): readonly TouchThreshold[] => table.thresholds;
export const touchThresholdsOrigin: Origin = {
  source: table.thresholdsSource,
  confidence: table.thresholdsConfidence,
};
export const touchNotes = (): readonly string[] => table.notes;
