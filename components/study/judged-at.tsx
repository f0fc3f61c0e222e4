import { StyleSheet, View } from 'react-native';

import { limitWords } from '@/api/contracts/run-words';
import type { Candidate, LimitVerdict } from '@/api/contracts/study';
import { wordsText } from '@/api/contracts/words-text';
import { hairline, space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';
import { Button } from '@/components/ui/button';
import { Heading } from '@/components/ui/heading';
import { Mark, type Verdict } from '@/components/ui/mark';
import { Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';
import { useUnits } from '@/hooks/use-units';

import { candidateName, heatText } from './candidate-words';
import { conditionsText } from './conditions-text';
import { unbroken } from './unbroken';

type JudgedAtProps = { candidate: Candidate; onWorking: (about: string) => void };

const marks: Record<LimitVerdict['verdict'], { verdict: Verdict; words: string }> = {
  met: { verdict: 'pass', words: 'met' },
  'not-met': { verdict: 'fail', words: 'not met' },
  'does-not-apply': { verdict: 'none', words: 'does not apply' },
  'cannot-tell': { verdict: 'caution', words: 'cannot be told' },
};

/** Each limit at the selected thickness: the verdict, what was compared, under which conditions, and who says so. */
export function JudgedAt({ candidate, onWorking }: JudgedAtProps) {
  const { units } = useUnits();
  const { heat, verdicts } = candidate;
  // where heat flow is limited, its working is the limit's
  const hasHeatLimit = verdicts.some(({ kind }) => kind === 'heat-flow');
  return (
    <Stack gap="xxs">
      <Heading>{`${capital(candidateName(candidate, units))} judged at`}</Heading>
      {verdicts.map((verdict) => (
        <Limit key={verdict.kind} verdict={verdict} onWorking={() => onWorking(verdict.kind)} />
      ))}
      <Line
        term={hasHeatLimit ? 'Heat flow in mean air' : 'Heat flow'}
        text={heatText(candidate, units, 1)}
        note={`${conditionsText(heat.judgedAt, units)}; ${heat.judgedAt.source}`}
        onWorking={() => onWorking(hasHeatLimit ? 'surface' : 'heat-flow')}
      />
    </Stack>
  );
}

function Limit({ verdict, onWorking }: { verdict: LimitVerdict; onWorking: () => void }) {
  const { units } = useUnits();
  const { kind, judgedAt, source } = verdict;
  const conditions = judgedAt ? [`${conditionsText(judgedAt, units)} (${judgedAt.source})`] : [];
  const isMarginal = verdict.state === 'marginal';
  return (
    <Line
      term={capital(limitWords[kind])}
      mark={isMarginal ? { verdict: 'caution', words: 'marginal' } : marks[verdict.verdict]}
      text={sentence(unbroken(wordsText(verdict.because, units)))}
      note={[...conditions, ...(source ? [source] : [])].join('; ')}
      onWorking={verdict.verdict === 'does-not-apply' ? undefined : onWorking}
    />
  );
}

type LineProps = {
  term: string;
  mark?: { verdict: Verdict; words: string };
  text: string;
  note: string;
  onWorking?: () => void;
};

function Line({ term, mark, text, note, onWorking }: LineProps) {
  const theme = useTheme();
  return (
    <View style={[styles.line, { borderBottomColor: theme.rule }]}>
      <View style={styles.term}>
        <Text weight="strong">{term}</Text>
        {mark ? <Mark {...mark} /> : null}
        {onWorking ? <Button label="Working" name={`Working of ${term.toLowerCase()}`} onPress={onWorking} /> : null}
      </View>
      <View style={styles.words}>
        <Text>{text}</Text>
        {note ? (
          <Text size="small" tone="inkSoft">
            {note}
          </Text>
        ) : null}
      </View>
    </View>
  );
}

const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);
const sentence = (text: string) => (text === '' ? '' : `${capital(text)}${text.endsWith('.') ? '' : '.'}`);

const styles = StyleSheet.create({
  line: {
    flexDirection: 'row',
    alignItems: 'flex-start',
    gap: space.sm,
    paddingVertical: space.xs,
    borderBottomWidth: hairline,
  },
  term: { width: 104, flexShrink: 0, alignItems: 'flex-start', gap: space.xxs },
  words: { flexGrow: 1, flexShrink: 1, flexBasis: 0, minWidth: 0 },
});
