import { EngineError } from '../engine-error';
import { oneOf } from './reading';
import type { Curve, CurvePoint, Material } from './rows';
import table from './tables/materials.json';

const curveKinds = ['max', 'typical', 'design', 'measured'] as const;
const all: readonly Material[] = table.map((row) => ({
  ...row,
  curve: curveOf(row.curve),
  otherCurves: row.otherCurves.map(curveOf),
}));
const byId = new Map(all.map((material) => [material.id, material]));

/** Generic materials by type of open standard, each with the curve that is used unless another is chosen. */
export const materials = (): readonly Material[] => all;

export const findMaterial = (id: string): Material | undefined => byId.get(id);

type CurveRow = { kind: string; points: readonly (readonly number[])[]; source: string; confidence: string };

function curveOf({ kind, points, source, confidence }: CurveRow): Curve {
  return { kind: oneOf(curveKinds, kind), points: points.map(pointOf), source, confidence };
}

function pointOf([temperature, conductivity]: readonly number[]): CurvePoint {
  if (temperature === undefined || conductivity === undefined) {
    throw new EngineError('A point of a conductivity curve has two numbers');
  }
  return [temperature, conductivity];
}
