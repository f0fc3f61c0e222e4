import type { DefaultValues } from 'react-hook-form';

import type { Run, RunDraft, ShapeKind } from '@/api/contracts/run';

/** While a form is filled in, a quantity may not be there yet. */
export type RunValues = DefaultValues<RunDraft>;
type ShapeValues = NonNullable<RunValues['shape']>;

const empty: Record<ShapeKind, ShapeValues> = {
  pipe: { kind: 'pipe', size: { standard: 'asme-steel', nominal: '' }, length: undefined, orientation: 'horizontal' },
  'round-duct': { kind: 'round-duct', diameter: undefined, length: undefined },
  'rectangular-duct': { kind: 'rectangular-duct', width: undefined, height: undefined, length: undefined },
  vessel: { kind: 'vessel', diameter: undefined, length: undefined, orientation: 'vertical', ends: 'flat', count: 1 },
  flat: { kind: 'flat', area: undefined, height: undefined, count: 1 },
  piece: { kind: 'piece', count: 1 },
};

/** Another shape keeps what both have: a length stays a length. */
export function asShape(kind: ShapeKind, before: ShapeValues): ShapeValues {
  const kept = Object.entries(before).filter(
    ([key, value]) => key !== 'kind' && key in empty[kind] && value !== undefined,
  );
  return { ...empty[kind], ...Object.fromEntries(kept) };
}

/** A new run begins with what the last one had: service, place, level, drawing and kind of pipe. */
export function newRun(last: Run | undefined, number: string): RunValues {
  const blank = { number, title: '', fittings: {}, status: 'measured', hold: null, override: null, note: '' } as const;
  if (!last) return { ...blank, ...nowhere, shape: empty.pipe };
  const { serviceId, placeId, levelId, drawingId, elevation } = last;
  const shape = { ...asShape(last.shape.kind, last.shape), length: undefined };
  return { ...blank, serviceId, placeId, levelId, drawingId, elevation, shape };
}

const nowhere = { serviceId: '', placeId: '', levelId: '', drawingId: null, elevation: null };

/** "R43" after "R42", "R01" where there is none. */
export function nextNumber(numbers: readonly string[]): string {
  const counted = numbers.flatMap((text) => {
    const [, head = '', digits = ''] = /^(.*?)(\d+)$/.exec(text) ?? [];
    return digits ? [{ head, digits }] : [];
  });
  const byCount = counted.toSorted((one, other) => Number(other.digits) - Number(one.digits));
  const last = byCount.find(({ head }) => head === mostUsed(counted.map((one) => one.head)));
  return last ? `${last.head}${String(Number(last.digits) + 1).padStart(last.digits.length, '0')}` : 'R01';
}

function mostUsed(heads: readonly string[]): string {
  const count = (head: string) => heads.filter((other) => other === head).length;
  return heads.toSorted((one, other) => count(other) - count(one))[0] ?? 'R';
}
