import { kindText, sizeText } from '@/api/contracts/run-words';
import type { Run, Shape } from '@/api/contracts/run';
import { findPipeSize } from '@/api/engine/standards/pipe-sizes';
import type { PipeSize } from '@/api/engine/standards/rows';

/** The standard row of a pipe's size; undefined for free diameters, ducts and equipment. */
export function standardSize(shape: Shape): PipeSize | undefined {
  if (shape.kind !== 'pipe' || shape.size.standard === 'other') return undefined;
  return findPipeSize(shape.size.standard, shape.size.nominal);
}

/** The nominal diameter by which a specification bands its rows. */
export const dnOf = (run: Run): number | null => standardSize(run.shape)?.dn ?? null;

/** A size as a person says it in a document: steel by its DN, tube by its own nominal, equipment by its name. */
export function sizeWords({ shape, title }: Run): string {
  if (shape.kind === 'pipe') return `${nominalWords(shape)} ${kindText(shape)}`;
  const size = sizeText(shape, 'SI');
  if (shape.kind === 'round-duct' || shape.kind === 'rectangular-duct') return size;
  if (shape.kind === 'piece') return title || kindText(shape);
  const each = shape.count > 1 ? `${size} each` : size;
  return title ? `${title}, ${each}` : each;
}

function nominalWords(shape: Shape): string {
  const size = standardSize(shape);
  return size?.standard === 'asme-steel' && size.dn !== null ? `DN ${size.dn}` : sizeText(shape, 'SI');
}

/** What sizes are ordered by [m]: bare diameter or width. */
export function extentOf(shape: Shape): number {
  switch (shape.kind) {
    case 'pipe':
      if (shape.size.standard === 'other') return shape.size.outsideDiameter.value;
      return standardSize(shape)?.outsideDiameter ?? 0;
    case 'rectangular-duct':
      return shape.width.value;
    case 'round-duct':
    case 'vessel':
      return shape.diameter.value;
    case 'flat':
      return shape.height.value;
    case 'piece':
      return 0;
  }
}

/**
 * The sizes of some runs in few words: "DN 40 to DN 150 steel". A range never spans a size that another run of
 * `others` has, for that one is insulated in another way.
 */
export function sizeRanges(runs: readonly Run[], others: readonly Run[]): string[] {
  const kinds = [...new Set(runs.map(({ shape }) => kindText(shape)))];
  return kinds.flatMap((kind) => {
    const ofKind = (list: readonly Run[]) => list.filter(({ shape }) => kindText(shape) === kind);
    const mine = ofKind(runs).toSorted((one, other) => extentOf(one.shape) - extentOf(other.shape));
    if (mine[0]?.shape.kind !== 'pipe') return [...new Set(mine.map(sizeWords))];
    return split(mine, ofKind(others)).map((range) => rangeWords(range, kind));
  });
}

function split(sorted: readonly Run[], others: readonly Run[]): Run[][] {
  const between = (low: number, high: number) =>
    others.some(({ shape }) => extentOf(shape) > low && extentOf(shape) < high);
  return sorted.reduce<Run[][]>((ranges, run) => {
    const range = ranges.at(-1);
    const last = range?.at(-1);
    if (!range || !last || between(extentOf(last.shape), extentOf(run.shape))) return [...ranges, [run]];
    range.push(run);
    return ranges;
  }, []);
}

function rangeWords(range: readonly Run[], kind: string): string {
  const [first, last] = [range[0], range.at(-1)].map((run) => (run ? nominalWords(run.shape) : ''));
  return first === last ? `${first} ${kind}` : `${first} to ${last} ${kind}`;
}
