import type { Layer } from '@/api/contracts/build-up';
import type { Size } from '@/api/contracts/run';
import { codeEditions, findCodeEdition } from '@/api/engine/standards/energy-codes';
import { findFinish } from '@/api/engine/standards/finishes';
import { findMaterial } from '@/api/engine/standards/materials';
import { findPipeSize } from '@/api/engine/standards/pipe-sizes';
import { nominalThickness } from '@/api/engine/standards/thickness-name';
import { thicknessSeries } from '@/api/engine/standards/thickness-series';

import type { Fields } from './field-problems';

const standard = /^std\/(.+)$/;
const rowOf = (libraryId: string) => standard.exec(libraryId)?.[1] ?? '';

// A specification may ask a thickness that this material is not stocked in: any name that some series makes is taken.
const madeNames = new Set<string>(thicknessSeries().flatMap(({ names }) => names));
const ductLocationIds = new Set(codeEditions().flatMap(({ ducts }) => (ducts?.locations ?? []).map(({ id }) => id)));

/** Layers from the inside out: known materials, made thicknesses, and only the outermost left to the study. */
export function layersFields(path: string, layers: readonly Layer[]): Fields {
  const fields: Fields = {};
  layers.forEach((layer, index) => {
    const { materialId, thickness } = layer;
    const at = `${path}.${index}`;
    if (!findMaterial(rowOf(materialId))) fields[`${at}.materialId`] = 'The library has no such material';
    if (thickness === null && index < layers.length - 1) {
      fields[`${at}.thickness`] = 'Must be chosen: only the outermost layer is left to the study';
    }
    if (thickness !== null && !madeNames.has(thickness)) {
      fields[`${at}.thickness`] = 'No series of the library makes this thickness';
    } else if (isThickerThanMade(layer)) {
      fields[`${at}.installed`] = 'Must not be more than its own thickness';
    }
  });
  return fields;
}

// half a millimetre: 51 mm may be typed for 2 in
const isThickerThanMade = ({ thickness, installed }: Layer): boolean =>
  thickness !== null && installed !== null && installed.value > nominalThickness(thickness) + 0.0005;

export function finishFields(path: string, finishId: string): Fields {
  const finish = findFinish(rowOf(finishId));
  if (!finish) return { [path]: 'The library has no such finish' };
  return finish.bare ? { [path]: 'A bare surface: not a finish over insulation' } : {};
}

export const editionFields = (path: string, edition: string): Fields =>
  findCodeEdition(edition) ? {} : { [path]: 'The library has no such code edition' };

export const ductLocationFields = (path: string, location: string | null): Fields =>
  location === null || ductLocationIds.has(location) ? {} : { [path]: 'No duct table knows this location' };

export const sizeFields = (path: string, size: Size): Fields =>
  size.standard === 'other' || findPipeSize(size.standard, size.nominal)
    ? {}
    : { [`${path}.nominal`]: 'Not a size of this standard' };
