import type { BuildUp } from '@/api/contracts/build-up';
import { DataTable, type Column } from '@/components/ui/data-table';
import { Text } from '@/components/ui/text';

import {
  bandText,
  bodyWords,
  materialsText,
  nameIn,
  placesText,
  retarderWords,
  shortName,
  thicknessesText,
  type CoveringNames,
} from './covering-words';

type BuildUpTableProps = { jobId: string; buildUps: readonly BuildUp[]; names: CoveringNames };

/** In the order of the services. */
export function BuildUpTable({ jobId, buildUps, names }: BuildUpTableProps) {
  return (
    <DataTable
      label="Build-ups"
      columns={[serviceColumn(names), ...coveringColumns<BuildUp>(names)]}
      rows={inOrderOfServices(buildUps, names)}
      keyOf={({ id }) => id}
      hrefOf={({ id }) => `/jobs/${jobId}/build-ups/${id}`}
    />
  );
}

/** As the schedule names them; within a service pipes first, smaller sizes first. */
export function inOrderOfServices<Row extends BuildUp>(rows: readonly Row[], { services }: CoveringNames): Row[] {
  const place = new Map(services.map(({ id }, index) => [id, index]));
  const rank = ({ serviceId }: Row) => place.get(serviceId) ?? services.length;
  const bodies = Object.keys(bodyWords);
  return [...rows].sort(
    (a, b) =>
      rank(a) - rank(b) ||
      bodies.indexOf(a.appliesTo) - bodies.indexOf(b.appliesTo) ||
      (a.fromDn ?? 0) - (b.fromDn ?? 0),
  );
}

const serviceColumn = ({ services }: CoveringNames): Column<BuildUp> => ({
  key: 'service',
  label: 'Service',
  cell: ({ serviceId }) => nameIn(services, serviceId),
});

/** What build-ups and specification rows have in common, as columns. */
export function coveringColumns<Row extends BuildUp>(names: CoveringNames): Column<Row>[] {
  return [
    { key: 'sizes', label: 'Applies to', cell: (row) => <Text noWrap>{sizesOf(row, names)}</Text> },
    { key: 'places', label: 'Places', cell: ({ placeIds }) => <Text>{placesText(placeIds, names.places)}</Text> },
    { key: 'material', label: 'Material', cell: ({ layers }) => <Text>{materialsText(layers, names.materials)}</Text> },
    {
      key: 'thickness',
      label: 'Thickness',
      numeric: true,
      cell: ({ layers }) => (
        <Text numeric noWrap align="right" weight="strong">
          {thicknessesText(layers, names.units)}
        </Text>
      ),
    },
    {
      key: 'finish',
      label: 'Finish',
      cell: ({ finishId }) => <Text>{shortName(nameIn(names.finishes, finishId))}</Text>,
    },
    {
      key: 'retarder',
      label: 'Vapour retarder',
      cell: ({ vapourRetarder }) => (
        <Text tone="inkSoft">{vapourRetarder === 'none' ? '–' : retarderWords[vapourRetarder]}</Text>
      ),
    },
  ];
}

/** Pipes by their sizes; ducts and equipment have none. */
const sizesOf = (row: BuildUp, names: CoveringNames) =>
  row.appliesTo === 'pipe' ? bandText(row, names) : bodyWords[row.appliesTo];
