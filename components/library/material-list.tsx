import type { LibraryMaterial } from '@/api/contracts/library';
import { useLayout } from '@/components/theme/use-layout';
import { DataTable, type Column } from '@/components/ui/data-table';
import { ListRows, type ListItem } from '@/components/ui/list-row';
import { Text } from '@/components/ui/text';
import { useUnits } from '@/hooks/use-units';

import { MaterialGlyph } from './material-glyph';
import { conductivityAt, conductivityText, conductivityUnit, limitsOfUseText } from './library-words';
import { degreesText } from '@/components/place/place-words';

type Units = ReturnType<typeof useUnits>['units'];

/** The address of a material: its id without the shelf that it stands on. */
export const materialHref = (id: string) => `/library/materials/${id.replace('std/', '')}` as const;

// a chilled, a heating and a steam pipe's insulation are about this warm in the middle
const means = [24, 50, 100];

export const materialItems = (materials: readonly LibraryMaterial[], units: Units): ListItem[] =>
  materials.map((material) => ({
    key: material.id,
    title: material.name,
    text: material.standards,
    aside: limitsOfUseText(material, units),
    glyph: <MaterialGlyph materialId={material.id} size={28} isClosed={material.closedCell} />,
    href: materialHref(material.id),
  }));

export function MaterialList({ materials }: { materials: readonly LibraryMaterial[] }) {
  const { units } = useUnits();
  const { isSplit } = useLayout();
  if (!isSplit) return <ListRows label="Materials" items={materialItems(materials, units)} flush />;
  return (
    <DataTable
      label="Materials"
      columns={columnsFor(units)}
      rows={materials}
      keyOf={({ id }) => id}
      hrefOf={({ id }) => materialHref(id)}
    />
  );
}

const columnsFor = (units: Units): readonly Column<LibraryMaterial>[] => [
  {
    key: 'section',
    label: 'Section',
    hideLabel: true,
    width: 44,
    cell: ({ id, closedCell }) => <MaterialGlyph materialId={id} size={28} isClosed={closedCell} />,
  },
  { key: 'name', label: 'Material', cell: ({ name }) => name },
  { key: 'standards', label: 'Standards', cell: ({ standards }) => <Text tone="inkSoft">{standards}</Text> },
  { key: 'use', label: 'Used between', cell: (material) => <Text noWrap>{limitsOfUseText(material, units)}</Text> },
  ...means.map((mean): Column<LibraryMaterial> => ({
    key: `k${mean}`,
    label: `k at ${degreesText(mean, units)}`,
    unit: conductivityUnit(units),
    numeric: true,
    cell: ({ curve }) => {
      const value = conductivityAt(curve, mean);
      return value === null ? '–' : conductivityText(value, units);
    },
  })),
];
