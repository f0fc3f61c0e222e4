import { EngineError } from '@/api/engine/engine-error';
import { findFinish } from '@/api/engine/standards/finishes';
import { findMaterial } from '@/api/engine/standards/materials';
import type { Finish, Material } from '@/api/engine/standards/rows';

/** @throws EngineError when the library has no such row */
export function materialOf(libraryId: string): Material {
  const material = findMaterial(bare(libraryId));
  if (!material) throw new EngineError(`The library has no material ${libraryId}`, 'layers');
  return material;
}

/** @throws EngineError when the library has no such row */
export function finishOf(libraryId: string): Finish {
  const finish = findFinish(bare(libraryId));
  if (!finish) throw new EngineError(`The library has no finish ${libraryId}`, 'finish');
  return finish;
}

/** The engine's own rows are named without the library's `std/`. */
const bare = (libraryId: string) => libraryId.replace(/^std\//, '');
