import { showWithUnit, type UnitSystem } from '@/api/contracts/quantities';
import { lengthOf } from '@/api/contracts/run-words';

import type { RunRow } from './run-row';

/** "14 runs · 822.0 m · 152 fittings · 8 flagged": what the list in sight holds. */
export function totalText(rows: readonly RunRow[], units: UnitSystem): string {
  const length = sum(rows, ({ run }) => lengthOf(run.shape) ?? 0);
  const fittings = sum(rows, ({ run: { fittings } }) =>
    sum(Object.entries(fittings), ([kind, count]) => (kind === 'hanger' ? 0 : count)),
  );
  const flagged = rows.filter(({ judged }) => judged && judged.flags.length > 0).length;
  return [
    `${rows.length} ${rows.length === 1 ? 'run' : 'runs'}`,
    ...(length > 0 ? [showWithUnit('length', length, { units })] : []),
    ...(fittings > 0 ? [`${fittings} fittings`] : []),
    ...(flagged > 0 ? [`${flagged} flagged`] : []),
  ].join(' · ');
}

const sum = <Item>(items: readonly Item[], of: (item: Item) => number) =>
  items.reduce((total, item) => total + of(item), 0);
