import type { LibrarySafety } from '@/api/contracts/library';
import { degreesText } from '@/components/place/place-words';
import { FactList } from '@/components/ui/fact-list';
import { Heading } from '@/components/ui/heading';
import { Notice } from '@/components/ui/notice';
import { Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';
import { useUnits } from '@/hooks/use-units';

import { confidenceText } from './library-words';
import { SourceLine } from './source-line';

/** Where a touch limit may begin; the project decides. */
export function TouchDetail({ safety }: { safety: LibrarySafety }) {
  const { units } = useUnits();
  const { touchDefaults, touchThresholds, notes } = safety;
  const [first] = touchThresholds;
  return (
    <Stack gap="lg">
      <Notice title="Starting values, not permission">
        The local code, the authority having jurisdiction and the project decide how hot a surface may get within reach.
        Let hot surfaces cool, or isolate them, before touching.
      </Notice>
      <Stack gap="xs">
        <Heading>Touch limits to begin with</Heading>
        <FactList
          termWidth={72}
          facts={touchDefaults.map(({ where, limit, basis, source, confidence }) => ({
            term: degreesText(limit, units),
            value: capital(where),
            note: `${capital(basis)}. Source: ${source}. Confidence: ${confidenceText(confidence)}.`,
          }))}
        />
      </Stack>
      <Stack gap="xs">
        <Heading>Burn thresholds behind them</Heading>
        <FactList
          termWidth={240}
          facts={touchThresholds.map(({ surface, contact, limit }) => ({
            term: `${capital(surface)}, ${contact}`,
            value: degreesText(limit, units),
          }))}
        />
        {first ? <SourceLine source={first.source} confidence={first.confidence} /> : null}
      </Stack>
      <Stack gap="xs" role="list">
        {notes.map((note) => (
          <Text key={note} role="listitem" tone="inkSoft">
            {note}
          </Text>
        ))}
      </Stack>
    </Stack>
  );
}

const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);
