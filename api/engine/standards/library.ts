import { EngineError } from '../engine-error';
import { findFinish } from './finishes';
import { findMaterial } from './materials';
import type { Finish, Material } from './rows';

const standard = /^std\//;

/**
 * The material of a library id (`std/mf_pipe`).
 *
 * @throws EngineError when the library has no such row
 */
export function material(libraryId: string): Material {
  const row = standard.test(libraryId) ? findMaterial(libraryId.replace(standard, '')) : undefined;
  if (!row) throw new EngineError(`The library has no material ${libraryId}`, 'material');
  return row;
}

/**
 * The finish of a library id (`std/pvc-jacket`).
 *
 * @throws EngineError when the library has no such row
 */
export function finish(libraryId: string): Finish {
  const row = standard.test(libraryId) ? findFinish(libraryId.replace(standard, '')) : undefined;
  if (!row) throw new EngineError(`The library has no finish ${libraryId}`, 'finish');
  return row;
}
