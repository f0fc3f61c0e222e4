import { useLocalSearchParams } from 'expo-router';
import { StyleSheet, View } from 'react-native';

import type { UnitSystem } from '@/api/contracts/quantities';
import { showWithUnit } from '@/api/contracts/quantities';
import { kindText, lengthOf } from '@/api/contracts/run-words';
import { thicknessText } from '@/api/contracts/words-text';
import { hairline, space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';
import { LinkArea } from '@/components/ui/link';
import { Mark } from '@/components/ui/mark';
import { Text, Words } from '@/components/ui/text';

import { RunGlyph } from './run-glyph';
import { rowSize, type RunRow } from './run-row';
import { runVerdict } from './run-verdict';

/** A run in a list on a phone: section, what it is, where and how long, what goes on it and its verdict. */
export function RunCard({ row, units }: { row: RunRow; units: UnitSystem }) {
  const theme = useTheme();
  const { job } = useLocalSearchParams<{ job: string }>();
  const { run, judged, service } = row;
  return (
    <LinkArea href={{ pathname: '/jobs/[job]/runs/[run]', params: { job, run: run.id } }}>
      <View style={[styles.card, { borderBottomColor: theme.rule }]}>
        <RunGlyph judged={judged} />
        <View style={styles.words}>
          <Text lines={2}>
            <Words weight="strong">{service?.name ?? ''}</Words>
            {` · ${rowSize(row, units)} ${kindText(run.shape)}`}
          </Text>
          <Text size="small" tone="inkSoft" lines={1}>
            {whereText(row, units)}
          </Text>
        </View>
        <View style={styles.verdict}>
          <Text numeric weight="strong" align="right" noWrap>
            {judged?.names.length ? thicknessText(judged.names, units) : '–'}
          </Text>
          <Mark {...runVerdict(judged)} align="right" />
        </View>
      </View>
    </LinkArea>
  );
}

function whereText({ run, place }: RunRow, units: UnitSystem): string {
  const length = lengthOf(run.shape);
  const parts = [
    run.number,
    place?.name ?? '',
    ...(length === null ? [] : [showWithUnit('length', length, { units })]),
  ];
  return parts.filter(Boolean).join(' · ');
}

const styles = StyleSheet.create({
  card: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.sm,
    paddingVertical: space.sm,
    borderBottomWidth: hairline,
  },
  words: { flex: 1, minWidth: 0 },
  verdict: { alignItems: 'flex-end', maxWidth: '38%' },
});
