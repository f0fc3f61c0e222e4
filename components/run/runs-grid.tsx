import { useVirtualizer } from '@tanstack/react-virtual';
import { useRef, useState, type KeyboardEvent } from 'react';
import { StyleSheet } from 'react-native';

import type { UnitSystem } from '@/api/contracts/quantities';
import { space, touchTarget } from '@/components/theme/tokens';
import { webStyle } from '@/components/theme/web-style';
import { Element } from '@/components/ui/element';

import { RunsGridHead, type GridSort } from './runs-grid-head';
import { RunsGridRow } from './runs-grid-row';
import { columnFields } from './run-fields';
import type { RunRow } from './run-row';

type RunsGridProps = {
  rows: readonly RunRow[];
  units: UnitSystem;
  sort: GridSort;
  /** only the columns that are always there */
  compact: boolean;
  chosenId: string | undefined;
  onOpen: (row: RunRow) => void;
};

/** The takeoff as a grid: only the rows in sight are drawn; arrows move, Enter opens. */
export function RunsGrid({ rows, units, sort, compact, chosenId, onOpen }: RunsGridProps) {
  // The compiler would keep what the virtualizer changes in place.
  'use no memo';
  const scroll = useRef<HTMLDivElement>(null);
  const virtual = useVirtualizer({
    count: rows.length,
    getScrollElement: () => scroll.current,
    estimateSize: () => rowHeight,
    overscan: 8,
    initialRect: { width: 1024, height: 800 },
  });
  const { active, move } = useActiveRow(rows, chosenId, (index) => virtual.scrollToIndex(index, { align: 'auto' }));
  const fields = columnFields.filter(({ column }) => !compact || column.always);
  const items = virtual.getVirtualItems();
  const before = items[0]?.start ?? 0;
  const after = virtual.getTotalSize() - (items.at(-1)?.end ?? 0);
  return (
    <Element tag="div" ref={scroll} style={styles.scroll}>
      <Element
        tag="table"
        role="grid"
        aria-label="Runs"
        aria-rowcount={rows.length + 1}
        style={[styles.table, !compact && styles.whole]}
        onKeyDown={move}
      >
        <RunsGridHead fields={fields} units={units} sort={sort} />
        <tbody>
          <Spacer height={before} />
          {items.map(({ index }) => {
            const row = rows[index];
            return row ? (
              <RunsGridRow
                key={row.run.id}
                row={row}
                fields={fields}
                units={units}
                index={index}
                active={index === active}
                chosen={row.run.id === chosenId}
                onOpen={onOpen}
              />
            ) : null;
          })}
          <Spacer height={after} />
        </tbody>
      </Element>
    </Element>
  );
}

/** One row can be tabbed to; the keys move it, bring it into sight and give it the focus. */
function useActiveRow(rows: readonly RunRow[], chosenId: string | undefined, show: (index: number) => void) {
  const [moved, setMoved] = useState<number | null>(null);
  const chosen = rows.findIndex(({ run }) => run.id === chosenId);
  const active = Math.min(moved ?? Math.max(chosen, 0), Math.max(rows.length - 1, 0));
  const move = (event: KeyboardEvent<HTMLTableElement>) => {
    const from = Number(rowUnder(event.target)?.dataset.index ?? active);
    const to = destination(event.key, from, rows.length - 1);
    if (to === null) return;
    event.preventDefault();
    const grid = event.currentTarget;
    setMoved(to);
    show(to);
    requestAnimationFrame(() => grid.querySelector<HTMLElement>(`[data-index="${to}"]`)?.focus());
  };
  return { active, move };
}

const rowUnder = (target: EventTarget) =>
  target instanceof HTMLElement ? target.closest<HTMLElement>('[data-index]') : null;

const page = 12;
function destination(key: string, from: number, last: number): number | null {
  const steps: Partial<Record<string, number>> = {
    ArrowDown: from + 1,
    ArrowUp: from - 1,
    PageDown: from + page,
    PageUp: from - page,
    Home: 0,
    End: last,
  };
  const to = steps[key];
  return to === undefined ? null : Math.min(Math.max(to, 0), last);
}

const Spacer = ({ height }: { height: number }) =>
  height > 0 ? (
    <tr aria-hidden>
      <Element tag="td" colSpan={columnFields.length + 1} style={[styles.spacer, { height }]} />
    </tr>
  ) : null;

const rowHeight = touchTarget + 1;
const styles = StyleSheet.create({
  scroll: webStyle({ overflow: 'auto', flex: 1, minHeight: 240, minWidth: 0, scrollPaddingTop: touchTarget }),
  table: webStyle({
    width: '100%',
    borderCollapse: 'separate',
    borderSpacing: 0,
    tableLayout: 'fixed',
    paddingBottom: space.md,
  }),
  whole: { minWidth: 1180 },
  spacer: webStyle({ padding: 0, borderWidth: 0 }),
});
