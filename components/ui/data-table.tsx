import { useRouter, type Href } from 'expo-router';
import type { MouseEvent, ReactNode } from 'react';
import { StyleSheet } from 'react-native';

import { fontFamily, hairline, space, touchTarget, type, weight } from '@/components/theme/tokens';
import { useLayout } from '@/components/theme/use-layout';
import { useTheme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';

import { Element } from './element';
import { Hidden } from './hidden';
import { Link } from './link';
import { Text } from './text';

export type Column<Row> = {
  key: string;
  label: string;
  /** stands in the head, never in the cells */
  unit?: string;
  /** figures: set to the right, of one width */
  numeric?: boolean;
  /** text becomes the kit's text; anything else stands as it is */
  cell: (row: Row) => ReactNode;
  width?: number;
  /** the label is read, not drawn: a column of glyphs */
  hideLabel?: boolean;
};

type DataTableProps<Row> = {
  /** what the table lists */
  label: string;
  columns: readonly Column<Row>[];
  rows: readonly Row[];
  keyOf: (row: Row) => string;
  /** where a row leads; its first text column becomes the link */
  hrefOf?: (row: Row) => Href;
  isChosen?: (row: Row) => boolean;
  /** totals, below a line */
  footer?: ReactNode;
};

/** A table for reading. Where it fits, its head stays in sight; on a small screen it moves sideways. A row with an address can be pressed anywhere. */
export function DataTable<Row>({ label, columns, rows, footer, ...row }: DataTableProps<Row>) {
  const theme = useTheme();
  const { isSplit } = useLayout();
  // what moves sideways must be reachable for the arrow keys
  const sideways = isSplit ? {} : { role: 'region', 'aria-label': label, tabIndex: 0, style: styles.scroll };
  return (
    <Element tag="div" {...sideways}>
      <Element tag="table" aria-label={label} style={styles.table}>
        <thead>
          <tr>
            {columns.map((column) => (
              <HeadCell key={column.key} column={column} />
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((one) => (
            <BodyRow
              key={row.keyOf(one)}
              row={one}
              columns={columns}
              href={row.hrefOf?.(one)}
              chosen={row.isChosen?.(one)}
            />
          ))}
        </tbody>
        {footer ? (
          <tfoot>
            <tr>
              <Element
                tag="td"
                colSpan={columns.length}
                style={[styles.cell, styles.foot, { borderTopColor: theme.ink }]}
              >
                {footer}
              </Element>
            </tr>
          </tfoot>
        ) : null}
      </Element>
    </Element>
  );
}

function HeadCell<Row>({ column }: { column: Column<Row> }) {
  const theme = useTheme();
  const { label, unit, numeric, width, hideLabel } = column;
  const colours = { color: theme.inkSoft, borderBottomColor: theme.ink, backgroundColor: theme.paper };
  return (
    <Element
      tag="th"
      scope="col"
      style={[styles.cell, styles.head, colours, numeric && styles.numeric, width ? { width } : null]}
    >
      {hideLabel ? <Hidden>{label}</Hidden> : label}
      {unit ? <Element tag="span" style={styles.unit}>{` ${unit}`}</Element> : null}
    </Element>
  );
}

type BodyRowProps<Row> = { row: Row; columns: readonly Column<Row>[]; href?: Href; chosen?: boolean };

function BodyRow<Row>({ row, columns, href, chosen = false }: BodyRowProps<Row>) {
  const theme = useTheme();
  const router = useRouter();
  const linked = href === undefined ? -1 : columns.findIndex((column) => typeof column.cell(row) === 'string');
  const open = (event: MouseEvent) => {
    const onControl = event.target instanceof DomElement && event.target.closest('a, button, input, select');
    if (href !== undefined && !onControl) router.push(href);
  };
  return (
    <Element
      tag="tr"
      aria-current={chosen || undefined}
      data-href={href === undefined ? undefined : ''}
      onClick={open}
      style={[href !== undefined && styles.pressable, chosen && { backgroundColor: theme.sheet }]}
    >
      {columns.map((column, index) => (
        <Element
          tag="td"
          key={column.key}
          style={[styles.cell, { borderBottomColor: theme.rule }, column.numeric && styles.numeric]}
        >
          {index === linked && href !== undefined ? (
            <CellLink href={href} content={column.cell(row)} />
          ) : (
            <Content content={column.cell(row)} numeric={column.numeric} />
          )}
        </Element>
      ))}
    </Element>
  );
}

const DomElement = globalThis.Element;

const CellLink = ({ href, content }: { href: Href; content: ReactNode }) =>
  typeof content === 'string' ? <Link href={href} label={content} tone="ink" strong inline /> : content;

function Content({ content, numeric }: { content: ReactNode; numeric?: boolean }) {
  if (typeof content !== 'string' && typeof content !== 'number') return content;
  return (
    <Text numeric={numeric} align={numeric ? 'right' : undefined} noWrap={numeric}>
      {content}
    </Text>
  );
}

const styles = StyleSheet.create({
  scroll: webStyle({ overflowX: 'auto', maxWidth: '100%' }),
  table: webStyle({ width: '100%', borderCollapse: 'separate', borderSpacing: 0 }),
  cell: webStyle({
    height: touchTarget,
    boxSizing: 'border-box',
    paddingTop: space.xxs,
    paddingBottom: space.xxs,
    paddingLeft: space.sm,
    paddingRight: space.sm,
    textAlign: 'left',
    verticalAlign: 'middle',
    borderBottomWidth: hairline,
    borderBottomStyle: 'solid',
  }),
  head: webStyle({
    position: 'sticky',
    top: 0,
    zIndex: 1,
    fontFamily,
    fontSize: type.small.fontSize,
    fontWeight: weight.strong,
    whiteSpace: 'nowrap',
    verticalAlign: 'bottom',
  }),
  unit: { fontWeight: weight.regular },
  numeric: webStyle({ textAlign: 'right', fontVariantNumeric: 'tabular-nums' }),
  foot: webStyle({ borderTopWidth: hairline, borderTopStyle: 'solid', borderBottomWidth: 0 }),
  pressable: webStyle({ cursor: 'pointer' }),
});
