import { StyleSheet, View } from 'react-native';

import { space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';

import { Text } from './text';

type ProgressProps = {
  /** what is going on: "Rendering the PDF" */
  label: string;
  /** how far, from 0 to 1; left out when nobody knows */
  done?: number;
  /** how far in words: "12 of 40 pages" */
  words?: string;
};

/** Long work: said in words, drawn as a line. It can be left; what it is for goes on. */
export function Progress({ label, done, words }: ProgressProps) {
  const theme = useTheme();
  const percent = done === undefined ? undefined : Math.round(Math.min(Math.max(done, 0), 1) * 100);
  const width = percent === undefined ? styles.unknown : { width: `${percent}%` as const };
  return (
    <View style={styles.progress}>
      <View style={styles.words}>
        <Text size="small">{label}</Text>
        {words ? (
          <Text size="small" tone="inkSoft" numeric>
            {words}
          </Text>
        ) : null}
      </View>
      <View
        role="progressbar"
        aria-label={label}
        aria-valuemin={0}
        aria-valuemax={100}
        aria-valuenow={percent}
        aria-valuetext={words}
        style={[styles.track, { backgroundColor: theme.rule }]}
      >
        <View style={[styles.bar, { backgroundColor: theme.oxide }, width]} />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  progress: { gap: space.xxs, minWidth: 160 },
  words: { flexDirection: 'row', justifyContent: 'space-between', gap: space.sm },
  track: { height: 4, borderRadius: 2, overflow: 'hidden' },
  bar: { height: 4, borderRadius: 2 },
  // public/index.html slows it down for those who ask for less movement
  unknown: webStyle({
    width: '30%',
    animationKeyframes: { from: { transform: 'translateX(-100%)' }, to: { transform: 'translateX(340%)' } },
    animationDuration: '1.6s',
    animationIterationCount: 'infinite',
  }),
});
