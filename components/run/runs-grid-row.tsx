import type { KeyboardEvent } from 'react';
import { StyleSheet } from 'react-native';

import type { UnitSystem } from '@/api/contracts/quantities';
import { hairline, space, touchTarget } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';
import { Element } from '@/components/ui/element';
import { Mark } from '@/components/ui/mark';
import { Text, Words } from '@/components/ui/text';

import type { ColumnField } from './run-fields';
import { RunGlyph } from './run-glyph';
import type { RunRow } from './run-row';
import { runVerdict } from './run-verdict';

type RunsGridRowProps = {
  row: RunRow;
  fields: readonly ColumnField[];
  units: UnitSystem;
  index: number;
  active: boolean;
  chosen: boolean;
  onOpen: (row: RunRow) => void;
};

export function RunsGridRow({ row, fields, units, index, active, chosen, onOpen }: RunsGridRowProps) {
  const theme = useTheme();
  const openOnEnter = (event: KeyboardEvent) => {
    if (event.key !== 'Enter' || event.target !== event.currentTarget) return;
    event.preventDefault();
    onOpen(row);
  };
  const cell = [styles.cell, { borderBottomColor: theme.rule }];
  return (
    <Element
      tag="tr"
      data-index={index}
      aria-rowindex={index + 2}
      aria-selected={chosen}
      tabIndex={active ? 0 : -1}
      onClick={() => onOpen(row)}
      onKeyDown={openOnEnter}
      style={[styles.row, chosen && { backgroundColor: theme.sheet }]}
    >
      <Element tag="td" style={cell}>
        <RunGlyph judged={row.judged} />
      </Element>
      {fields.map((field) => (
        <Element key={field.key} tag="td" style={[cell, field.column.numeric && styles.numeric]}>
          <CellText field={field} row={row} units={units} />
        </Element>
      ))}
    </Element>
  );
}

const strong = new Set(['service']);
const soft = new Set(['number', 'fittings']);

function CellText({ field: { key, column }, row, units }: { field: ColumnField; row: RunRow; units: UnitSystem }) {
  if (key === 'limits') return <Mark {...runVerdict(row.judged)} />;
  const note = column.note?.(row);
  return (
    <Text
      numeric={column.numeric}
      align={column.numeric ? 'right' : undefined}
      weight={strong.has(key) ? 'strong' : 'regular'}
      tone={soft.has(key) ? 'inkSoft' : 'ink'}
      lines={1}
    >
      {column.text(row, units)}
      {note ? <Words tone="inkSoft">{` ${note}`}</Words> : null}
    </Text>
  );
}

const styles = StyleSheet.create({
  row: webStyle({ cursor: 'pointer', height: touchTarget }),
  cell: webStyle({
    height: touchTarget,
    boxSizing: 'border-box',
    paddingTop: 0,
    paddingBottom: 0,
    paddingLeft: space.xs,
    paddingRight: space.xs,
    borderBottomWidth: hairline,
    borderBottomStyle: 'solid',
    overflow: 'hidden',
    whiteSpace: 'nowrap',
    textOverflow: 'ellipsis',
    verticalAlign: 'middle',
  }),
  numeric: webStyle({ textAlign: 'right' }),
});
