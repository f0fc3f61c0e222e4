import { EngineError } from '../engine-error';
import type { ThicknessName } from './thickness-name';

/** Narrows a word of a table to one of a list, so that a slip in a table fails the tests and not a person. */
export function oneOf<Word extends string>(words: readonly Word[], text: string): Word {
  const word = words.find((candidate) => candidate === text);
  if (word === undefined) throw new EngineError(`A table says ${text}; known are ${words.join(', ')}`);
  return word;
}

export const nameOf = (unit: 'in' | 'mm', nominal: number): ThicknessName => `${unit}:${nominal}`;

/** Millimetres of a table in m, without the noise of a division by 1000. */
export const metres = (millimetres: number): number => Number((millimetres / 1000).toFixed(8));
