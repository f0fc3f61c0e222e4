import { useLocalSearchParams, type Href } from 'expo-router';
import { StyleSheet, View } from 'react-native';

import type { Flag } from '@/api/contracts/judgement';
import type { UnitSystem } from '@/api/contracts/quantities';
import { flagWords, kindText } from '@/api/contracts/run-words';
import { wordsText } from '@/api/contracts/words-text';
import { RunGlyph } from '@/components/run/run-glyph';
import { rowSize, type RunRow } from '@/components/run/run-row';
import { hairline, space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';
import { LinkArea } from '@/components/ui/link';
import { Mark } from '@/components/ui/mark';
import { Text, Words } from '@/components/ui/text';

export type FlaggedRun = { row: RunRow; flags: readonly Flag[] };

/** Runs that need a decision: which limit, by how much, and what would meet it; each leads to its study. */
export function FlagList({ flagged, units }: { flagged: readonly FlaggedRun[]; units: UnitSystem }) {
  return (
    <View role="list" aria-label="Flags">
      {flagged.map((one) => (
        <View role="listitem" key={one.row.run.id}>
          <FlaggedRunItem flagged={one} units={units} />
        </View>
      ))}
    </View>
  );
}

function FlaggedRunItem({ flagged: { row, flags }, units }: { flagged: FlaggedRun; units: UnitSystem }) {
  const theme = useTheme();
  const { job } = useLocalSearchParams<{ job: string }>();
  const href: Href = { pathname: '/jobs/[job]/runs/[run]', params: { job, run: row.run.id } };
  return (
    <LinkArea href={href}>
      <View style={[styles.item, { borderBottomColor: theme.rule }]}>
        <RunGlyph judged={row.judged} />
        <View style={styles.words}>
          <Text>
            <Words weight="strong">{`${row.run.number} ${row.service?.name ?? ''}`}</Words>
            {` · ${rowSize(row, units)} ${kindText(row.run.shape)} · ${row.place?.name ?? ''}`}
          </Text>
          {flags.map((flag) => (
            <FlagLine key={flag.kind} flag={flag} units={units} />
          ))}
        </View>
      </View>
    </LinkArea>
  );
}

export function FlagLine({ flag, units }: { flag: Flag; units: UnitSystem }) {
  const mild = flag.kind === 'hold' || flag.verdict?.state === 'marginal';
  return (
    <View style={styles.line}>
      <View style={styles.kind}>
        <Mark verdict={mild ? 'caution' : 'fail'} words={flagWords[flag.kind]} strong />
      </View>
      <View style={styles.says}>
        <Text>{wordsText(flag.words, units)}</Text>
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  item: { flexDirection: 'row', gap: space.sm, paddingVertical: space.md, borderBottomWidth: hairline },
  words: { flex: 1, minWidth: 0, gap: space.xxs },
  line: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.sm },
  kind: { width: 128 },
  says: { flexGrow: 1, flexShrink: 1, flexBasis: 240 },
});
