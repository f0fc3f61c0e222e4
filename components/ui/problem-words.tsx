import { StyleSheet, View } from 'react-native';

import { measure, space } from '@/components/theme/tokens';

import { Button } from './button';
import { Text } from './text';

/** As the server says it (RFC 9457), or the browser for it. */
export type ShownProblem = { title: string; status: number; detail?: string; reference?: string };

type ProblemWordsProps = {
  problem: ShownProblem;
  /** asks again; left out where asking again cannot help */
  onRetry?: () => void;
};

/** What is wrong with a part of a screen, and the way on. */
export function ProblemWords({ problem, onRetry }: ProblemWordsProps) {
  const { title, detail, status, reference } = problem;
  // what was refused stays refused; the rest may have passed
  const again = onRetry && (status === 0 || status === 429 || status >= 500);
  return (
    <View role="alert" style={styles.words}>
      {detail && detail !== title ? <Text size="lead">{detail}</Text> : null}
      {reference ? <Text size="small" tone="inkSoft">{`Reference for your administrator: ${reference}`}</Text> : null}
      {again ? <Button label="Try again" tone="action" onPress={onRetry} /> : null}
    </View>
  );
}

const styles = StyleSheet.create({ words: { gap: space.md, maxWidth: measure, alignItems: 'flex-start' } });
