import { StyleSheet, View } from 'react-native';

import { hairline, radius, space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';

import { Hidden } from './hidden';

/** What will stand there: lines of a list, rows of a table, cards, fields, or a drawing with its sentence. */
export type Shape = 'list' | 'table' | 'cards' | 'form' | 'study';

/** The shape of what comes, so that nothing jumps when it is there. */
export function Loading({ label, shape = 'list' }: { label: string; shape?: Shape }) {
  return (
    <View role="status" aria-busy style={styles.shape}>
      <Hidden>{`Loading: ${label}`}</Hidden>
      {shape === 'study' ? <Drawing /> : Array.from({ length: 6 }, (_, index) => <Line key={index} shape={shape} />)}
    </View>
  );
}

function Line({ shape }: { shape: Shape }) {
  const theme = useTheme();
  if (shape === 'cards')
    return <View style={[styles.card, { borderColor: theme.rule, backgroundColor: theme.sheet }]} />;
  if (shape === 'form')
    return <View style={[styles.field, { borderColor: theme.rule, backgroundColor: theme.sheet }]} />;
  return (
    <View style={[styles.line, { borderBottomColor: theme.rule }]}>
      {shape === 'list' ? <View style={[styles.glyph, { borderColor: theme.rule }]} /> : null}
      <View style={[styles.bar, styles.long, { backgroundColor: theme.rule }]} />
      <View style={[styles.bar, styles.short, { backgroundColor: theme.rule }]} />
    </View>
  );
}

function Drawing() {
  const theme = useTheme();
  return (
    <View style={styles.drawing}>
      <View style={[styles.bar, styles.sentence, { backgroundColor: theme.rule }]} />
      <View style={[styles.strip, { borderBottomColor: theme.rule }]}>
        {[20, 34, 44, 54, 64, 76].map((side) => (
          <View
            key={side}
            style={{ width: side, height: side, borderRadius: side / 2, borderWidth: 1, borderColor: theme.rule }}
          />
        ))}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  shape: { gap: 0 },
  line: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.md,
    height: 64,
    borderBottomWidth: hairline,
  },
  glyph: { width: 28, height: 28, borderRadius: 14, borderWidth: 1 },
  bar: { height: 12, borderRadius: radius.sm, opacity: 0.7 },
  long: { width: '38%' },
  short: { width: '16%', marginLeft: 'auto' },
  card: { height: 120, borderWidth: hairline, borderRadius: radius.md, marginBottom: space.md },
  field: { height: 44, borderWidth: hairline, borderRadius: radius.sm, marginBottom: space.lg, maxWidth: 480 },
  drawing: { gap: space.xl },
  sentence: { height: 21, width: '70%' },
  strip: { flexDirection: 'row', alignItems: 'flex-end', gap: space.lg, height: 240, borderBottomWidth: 1 },
});
