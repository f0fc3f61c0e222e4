import { StyleSheet } from 'react-native';

import type { UnitSystem } from '@/api/contracts/quantities';
import { fontFamily, hairline, space, touchTarget, type, weight } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';
import { Element } from '@/components/ui/element';
import { Hidden } from '@/components/ui/hidden';

import { columnHead, type ColumnField } from './run-fields';

export type GridSort = {
  directionOf: (key: string) => 'asc' | 'desc' | undefined;
  toggle: (key: string) => void;
};

const ariaSort = { asc: 'ascending', desc: 'descending' } as const;
const arrows = { asc: ' ↑', desc: ' ↓' } as const;

/** Names of the columns with their units; pressing one sorts by it, again the other way, again not at all. */
type RunsGridHeadProps = { fields: readonly ColumnField[]; units: UnitSystem; sort: GridSort };

export function RunsGridHead({ fields, units, sort }: RunsGridHeadProps) {
  const theme = useTheme();
  const colours = { backgroundColor: theme.paper, borderBottomColor: theme.ink };
  return (
    <thead>
      <tr>
        <Element tag="th" scope="col" style={[styles.cell, styles.glyph, colours]}>
          <Hidden>Section</Hidden>
        </Element>
        {fields.map((field) => (
          <HeadCell key={field.key} field={field} units={units} sort={sort} />
        ))}
      </tr>
    </thead>
  );
}

function HeadCell({ field, units, sort }: { field: ColumnField; units: UnitSystem; sort: GridSort }) {
  const theme = useTheme();
  const { width, grow, numeric } = field.column;
  const direction = sort.directionOf(field.key);
  const colours = { backgroundColor: theme.paper, borderBottomColor: theme.ink };
  return (
    <Element
      tag="th"
      scope="col"
      aria-sort={direction ? ariaSort[direction] : undefined}
      style={[styles.cell, colours, grow ? null : { width }]}
    >
      <Element
        tag="button"
        type="button"
        onClick={() => sort.toggle(field.key)}
        style={[styles.button, { color: direction ? theme.ink : theme.inkSoft }, numeric && styles.numeric]}
      >
        {columnHead(field, units)}
        {direction ? arrows[direction] : ''}
      </Element>
    </Element>
  );
}

const styles = StyleSheet.create({
  cell: webStyle({
    position: 'sticky',
    top: 0,
    zIndex: 1,
    padding: 0,
    height: touchTarget,
    borderBottomWidth: hairline,
    borderBottomStyle: 'solid',
  }),
  glyph: { width: touchTarget },
  button: webStyle({
    width: '100%',
    height: touchTarget,
    margin: 0,
    paddingTop: 0,
    paddingBottom: 0,
    paddingLeft: space.xs,
    paddingRight: space.xs,
    borderWidth: 0,
    backgroundColor: 'transparent',
    fontFamily,
    fontSize: type.small.fontSize,
    fontWeight: weight.strong,
    textAlign: 'left',
    whiteSpace: 'nowrap',
    cursor: 'pointer',
  }),
  numeric: webStyle({ textAlign: 'right' }),
});
