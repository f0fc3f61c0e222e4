import { EngineError } from '../engine-error';
import type { Finish } from './rows';
import table from './tables/finishes.json';

const all: readonly Finish[] = table.map((row) => ({ ...row, emittanceRange: rangeOf(row.emittanceRange) }));
const byId = new Map(all.map((finish) => [finish.id, finish]));

/** Jackets, facings and bare surfaces with their emittance as new (low) and aged (high). */
export const finishes = (): readonly Finish[] => all;

export const findFinish = (id: string): Finish | undefined => byId.get(id);

function rangeOf([low, high]: readonly number[]): readonly [number, number] {
  if (low === undefined || high === undefined) throw new EngineError('A range of emittance has two numbers');
  return [low, high];
}
