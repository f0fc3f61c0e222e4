import type { LibrarySeries } from '@/api/contracts/library';
import { thicknessText } from '@/api/contracts/words-text';
import { Disclosure } from '@/components/ui/disclosure';
import { FactList } from '@/components/ui/fact-list';
import { Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';
import { useUnits } from '@/hooks/use-units';

import { formWords } from './library-words';
import { SourceLine } from './source-line';

const tableWords: Record<LibrarySeries['tables'], string> = {
  rigid: 'Real outside diameters of rigid sections are known and used',
  flexible: 'Real outside diameters of flexible tube are known and used',
  none: 'The nominal thickness is used; results say so',
};

/** Thicknesses that can be bought, each by its name. */
export const SeriesList = ({ series }: { series: readonly LibrarySeries[] }) => (
  <Stack gap="xxs">
    {series.map((one) => (
      <SeriesLine key={one.id} series={one} />
    ))}
  </Stack>
);

function SeriesLine({ series }: { series: LibrarySeries }) {
  const { units } = useUnits();
  const { title, form, names, installed, sizes, tables, note, source, confidence } = series;
  return (
    <Disclosure
      summary={
        <Stack gap="xxs">
          <Text weight="strong">{title}</Text>
          <Text numeric>{thicknessText(names, units).replaceAll(' + ', ' · ')}</Text>
        </Stack>
      }
    >
      <FactList
        facts={[
          { term: 'Form', value: formWords[form] },
          ...(sizes ? [{ term: 'Made for', value: sizes }] : []),
          { term: 'Diameters', value: tableWords[tables] },
          ...(installed === null
            ? []
            : [{ term: 'Put up', value: `${Math.round(installed * 100)}% of the name is left` }]),
          ...(note ? [{ term: 'Note', value: note }] : []),
        ]}
      />
      <SourceLine source={source} confidence={confidence} />
    </Disclosure>
  );
}
