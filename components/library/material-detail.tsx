import { StyleSheet, View } from 'react-native';

import type { LibraryCurve, LibraryMaterial, LibrarySeries } from '@/api/contracts/library';
import { inUnits, show, unitLabel } from '@/api/contracts/quantities';
import { thicknessText } from '@/api/contracts/words-text';
import { DrawnCurves } from '@/components/drawing/drawn';
import { space } from '@/components/theme/tokens';
import { DataTable, type Column } from '@/components/ui/data-table';
import { Disclosure } from '@/components/ui/disclosure';
import { FactList } from '@/components/ui/fact-list';
import { Heading } from '@/components/ui/heading';
import { Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';
import { useUnits } from '@/hooks/use-units';

import { conductivityText, conductivityUnit, curveWords, limitsOfUseText } from './library-words';
import { SourceLine } from './source-line';

type MaterialDetailProps = { material: LibraryMaterial; series: readonly LibrarySeries[] };

/** What is known about a material, the curve that is calculated with first. */
export function MaterialDetail({ material, series }: MaterialDetailProps) {
  const { units } = useUnits();
  const made = series.filter(({ id }) => material.series.includes(id));
  return (
    <Stack gap="lg">
      <Curves material={material} />
      <FactList
        facts={[
          { term: 'Standards', value: material.standards },
          { term: 'Taken as', value: material.useType },
          {
            term: 'Used between',
            value: limitsOfUseText(material, units),
            note: [...new Set([material.useMinimumSource, material.useMaximumSource])].filter(Boolean).join('; '),
          },
          {
            term: 'Water vapour',
            value: material.closedCell
              ? 'Closed cells: the material itself can be the vapour retarder'
              : 'Open: cold services need a vapour retarder',
          },
          ...(material.flameSmoke ? [{ term: 'Flame and smoke', value: material.flameSmoke }] : []),
          ...(material.conductivityTolerance === null
            ? []
            : [{ term: 'Conductivity', value: `within ± ${Math.round(material.conductivityTolerance * 100)}%` }]),
          ...made.map(({ title, names }) => ({
            term: title,
            value: thicknessText(names, units).replaceAll(' + ', ', '),
          })),
        ]}
      />
      {material.notes.length > 0 ? (
        <Disclosure summary={<Text weight="strong">Notes</Text>}>
          <Stack gap="xxs" role="list">
            {material.notes.map((note) => (
              <Text key={note} role="listitem">
                {note}
              </Text>
            ))}
          </Stack>
        </Disclosure>
      ) : null}
    </Stack>
  );
}

function Curves({ material: { name, curve, otherCurves } }: { material: LibraryMaterial }) {
  const { units } = useUnits();
  const curves = [curve, ...otherCurves];
  const shown = curves.map(({ points }) =>
    points.map(([mean, k]) => [inUnits('temperature', mean, units), inUnits('conductivity', k, units)] as const),
  );
  return (
    <Stack gap="sm">
      <Heading>Conductivity</Heading>
      <DrawnCurves
        label={`Conductivity of ${name} over mean temperature; the numbers follow in tables`}
        curves={shown}
        across={`mean temperature ${unitLabel('temperature', units)}`}
        up={conductivityUnit(units)}
        digits={units === 'SI' ? 2 : 1}
      />
      {curves.map((one, index) => (
        <CurveLine key={`${one.kind} ${one.source}`} curve={one} isUsed={index === 0} />
      ))}
    </Stack>
  );
}

/** The strong line is calculated with; the dashed ones are there to compare. */
function CurveLine({ curve, isUsed }: { curve: LibraryCurve; isUsed: boolean }) {
  return (
    <Disclosure
      open={isUsed}
      summary={
        <Text weight={isUsed ? 'strong' : 'regular'}>
          {`${curveWords[curve.kind]}${isUsed ? ': calculated with, the strong line' : ', to compare'}`}
        </Text>
      }
    >
      <View style={styles.points}>
        <PointTable curve={curve} />
      </View>
      <SourceLine source={curve.source} confidence={curve.confidence} />
    </Disclosure>
  );
}

type Point = LibraryCurve['points'][number];

function PointTable({ curve }: { curve: LibraryCurve }) {
  const { units } = useUnits();
  const columns: readonly Column<Point>[] = [
    {
      key: 'mean',
      label: 'Mean temperature',
      unit: unitLabel('temperature', units),
      numeric: true,
      cell: ([mean]) => show('temperature', mean, { units, digits: 0 }),
    },
    {
      key: 'k',
      label: 'Conductivity',
      unit: conductivityUnit(units),
      numeric: true,
      cell: ([, k]) => conductivityText(k, units),
    },
  ];
  return (
    <DataTable label={curveWords[curve.kind]} columns={columns} rows={curve.points} keyOf={([mean]) => String(mean)} />
  );
}

const styles = StyleSheet.create({ points: { maxWidth: 420, paddingBottom: space.xs } });
