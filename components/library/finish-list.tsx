import type { LibraryFinish } from '@/api/contracts/library';
import { degreesText } from '@/components/place/place-words';
import { Disclosure } from '@/components/ui/disclosure';
import { FactList } from '@/components/ui/fact-list';
import { Row, Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';
import { useUnits } from '@/hooks/use-units';

import { SourceLine } from './source-line';

/** Bright as new is what burns and sweats; aged is what heat flow is counted with. */
export function FinishList({ finishes }: { finishes: readonly LibraryFinish[] }) {
  return (
    <Stack gap="xxs">
      {finishes.map((finish) => (
        <FinishLine key={finish.id} finish={finish} />
      ))}
    </Stack>
  );
}

function FinishLine({ finish }: { finish: LibraryFinish }) {
  const { units } = useUnits();
  const { name, kind, emittanceNew, emittanceAged, emittanceRange, maximum, maximumSource, source, confidence } =
    finish;
  return (
    <Disclosure
      summary={
        <Row spread wrap={false} gap="sm">
          <Text weight="strong">{name}</Text>
          <Text numeric align="right">{`${emittanceNew.toFixed(2)} new, ${emittanceAged.toFixed(2)} aged`}</Text>
        </Row>
      }
    >
      <FactList
        facts={[
          { term: 'Kind', value: finish.bare ? `${kind}, bare: not a finish over insulation` : kind },
          {
            term: 'Emittance',
            value: `${emittanceRange[0].toFixed(2)} to ${emittanceRange[1].toFixed(2)} in the sources`,
          },
          {
            term: 'Up to',
            value: maximum === null ? 'not stated' : degreesText(maximum, units),
            note: maximum === null ? undefined : maximumSource,
          },
        ]}
      />
      <SourceLine source={source} confidence={confidence} />
    </Disclosure>
  );
}
