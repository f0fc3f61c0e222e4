import { StyleSheet, View } from 'react-native';

import { limitWords } from '@/api/contracts/run-words';
import { space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';
import { Text } from '@/components/ui/text';
import { useUnits } from '@/hooks/use-units';

import { shortConditions } from './conditions-text';
import { curvesOf, type StudiedRun } from './study-facts';

/** Which surface each line is, and what it was judged at: beside the drawing, since no number stands without its conditions. */
export function CurveKey({ runStudy }: { runStudy: StudiedRun }) {
  const theme = useTheme();
  const { units } = useUnits();
  const bare = runStudy.study.candidates[0];
  if (!bare) return null;
  return (
    <View style={styles.keys}>
      {curvesOf(runStudy).map(({ id, ink }) => {
        const verdict = bare.verdicts.find(({ kind }) => kind === id);
        const judgedAt = verdict?.judgedAt ?? bare.heat.judgedAt;
        const what = verdict ? `Surface for ${limitWords[verdict.kind]}` : 'Surface';
        return (
          <View key={id} style={styles.key}>
            <View style={[styles.line, { backgroundColor: theme[ink] }]} />
            <View style={styles.words}>
              <Text size="small" tone="inkSoft">{`${what}: ${shortConditions(judgedAt, units)}`}</Text>
            </View>
          </View>
        );
      })}
    </View>
  );
}

const styles = StyleSheet.create({
  keys: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.lg, rowGap: space.xxs },
  key: { flexDirection: 'row', alignItems: 'center', gap: space.xs, maxWidth: '100%' },
  line: { width: 18, height: 2 },
  words: { flexShrink: 1, minWidth: 0 },
});
