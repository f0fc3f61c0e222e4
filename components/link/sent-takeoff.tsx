import { StyleSheet, View } from 'react-native';

import type { LinkView } from '@/api/contracts/link';
import { wordsText } from '@/api/contracts/words-text';
import { ScheduleList } from '@/components/schedule/schedule-list';
import { TakeoffTables } from '@/components/takeoff/takeoff-tables';
import { measure, space } from '@/components/theme/tokens';
import { Disclosure } from '@/components/ui/disclosure';
import { Heading } from '@/components/ui/heading';
import { Stack } from '@/components/ui/stack';
import { Text, Words } from '@/components/ui/text';

export type Sent = NonNullable<LinkView['sent']>;

/** The body of what was sent: scope, clarifications, schedule, quantities, conditions, cautions. The document's units. */
export function SentTakeoff({ sent }: { sent: Sent }) {
  const { job, clarifications, schedule, takeoff, conditions, cautions } = sent;
  return (
    <Stack gap="lg">
      {job.scope ? (
        <View style={styles.text}>
          <Text size="lead">{job.scope}</Text>
        </View>
      ) : null}
      {clarifications.length > 0 ? <Clarifications clarifications={clarifications} /> : null}
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

function Clarifications({ clarifications }: Pick<Sent, 'clarifications'>) {
  const count = clarifications.length;
  return (
    <Part title={count === 1 ? 'One point to decide' : `${count} points to decide`}>
      <View role="list" style={styles.text}>
        {clarifications.map(({ number, title, entries }) => (
          <View role="listitem" key={number} style={styles.point}>
            <Text weight="strong">{`${number}. ${title}`}</Text>
            {entries.map(({ runs, words }) => (
              <Text key={runs}>
                <Words tone="inkSoft" numeric>{`${runs}: `}</Words>
                {wordsText(words, 'SI')}
              </Text>
            ))}
          </View>
        ))}
      </View>
    </Part>
  );
}

const styles = StyleSheet.create({
  text: { maxWidth: measure, gap: space.xs },
  point: { gap: space.xxs },
});
