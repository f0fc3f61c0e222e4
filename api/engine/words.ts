import type { ThicknessName } from './standards/thickness-name';

/** Kinds of number that a person reads in units of his own; the names are those of contracts/quantities.ts. */
export type WordsKind =
  | 'length'
  | 'dimension'
  | 'temperature'
  | 'difference'
  | 'speed'
  | 'humidity'
  | 'heatPerLength'
  | 'heatFlux'
  | 'coefficient'
  | 'conductivity'
  | 'resistance';

/** A sentence without units: text, numbers with their kind, and thickness names. Screen and document put it in their own units. */
export type Words = (string | { kind: WordsKind; value: number; digits?: number } | { thickness: ThicknessName[] })[];
