import { StyleSheet, View } from 'react-native';

import type { LinkView } from '@/api/contracts/link';
import { flagWords } from '@/api/contracts/run-words';
import { wordsText } from '@/api/contracts/words-text';
import { ScheduleList } from '@/components/schedule/schedule-list';
import { TakeoffTables } from '@/components/takeoff/takeoff-tables';
import { measure, space } from '@/components/theme/tokens';
import { Disclosure } from '@/components/ui/disclosure';
import { Heading } from '@/components/ui/heading';
import { Mark } from '@/components/ui/mark';
import { Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';

export type Sent = NonNullable<LinkView['sent']>;

/** The body of what was sent: scope, clarifications, schedule, quantities, conditions, cautions. The document's units. */
export function SentTakeoff({ sent }: { sent: Sent }) {
  const { job, flags, schedule, takeoff, conditions, cautions } = sent;
  return (
    <Stack gap="lg">
      {job.scope ? (
        <View style={styles.text}>
          <Text size="lead">{job.scope}</Text>
        </View>
      ) : null}
      {flags.length > 0 ? <Clarifications flags={flags} /> : null}
      <Part title="Schedule of insulation">
        <ScheduleList rows={schedule.rows} units="SI" />
      </Part>
      <Part title="Quantities, net">
        <TakeoffTables takeoff={takeoff} units="SI" />
      </Part>
      <Disclosure summary={<Heading>Conditions it was judged at</Heading>}>
        <Stack gap="sm">
          {conditions.map(({ place, words }) => (
            <View key={place} style={styles.text}>
              <Text weight="strong">{place}</Text>
              {words.map((line) => (
                <Text key={line} size="small" tone="inkSoft">
                  {line}
                </Text>
              ))}
            </View>
          ))}
        </Stack>
      </Disclosure>
      <Part title="Cautions">
        <View style={styles.text}>
          {cautions.map((caution) => (
            <Text key={caution}>{caution}</Text>
          ))}
        </View>
      </Part>
    </Stack>
  );
}

const Part = ({ title, children }: { title: string; children: React.ReactNode }) => (
  <Stack gap="sm">
    <Heading>{title}</Heading>
    {children}
  </Stack>
);

function Clarifications({ flags }: { flags: Sent['flags'] }) {
  return (
    <Part title={flags.length === 1 ? 'One point to decide' : `${flags.length} points to decide`}>
      <View role="list" style={styles.text}>
        {flags.map((flag, index) => (
          <View role="listitem" key={`${flag.runNumber} ${flag.kind}`} style={styles.flag}>
            <Text numeric tone="inkSoft">{`${index + 1}.`}</Text>
            <View style={styles.words}>
              <Mark
                verdict={flag.kind === 'hold' || flag.verdict?.state === 'marginal' ? 'caution' : 'fail'}
                words={`${flag.runNumber}, ${flagWords[flag.kind]}`}
                size="body"
                strong
              />
              <Text>{wordsText(flag.words, 'SI')}</Text>
            </View>
          </View>
        ))}
      </View>
    </Part>
  );
}

const styles = StyleSheet.create({
  text: { maxWidth: measure, gap: space.xs },
  flag: { flexDirection: 'row', gap: space.xs },
  words: { flex: 1, minWidth: 0 },
});
