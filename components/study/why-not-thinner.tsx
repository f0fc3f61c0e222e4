import type { RunStudy } from '@/api/contracts/study';
import { Heading } from '@/components/ui/heading';
import { Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';

import { methodWords } from './conditions-text';
import { EngineWords } from './words';

/** Why no less is proposed; why what is up departs; and with what it was calculated. */
export function WhyNotThinner({ runStudy: { study, assembly } }: { runStudy: RunStudy }) {
  const notes = [...new Set(study.notes)];
  return (
    <Stack gap="xs">
      <Heading>Why not thinner</Heading>
      <Text>
        <EngineWords words={study.whyNotThinner} />
      </Text>
      {assembly.source === 'chosen' && assembly.reason ? (
        <Stack gap="xxs">
          <Heading>Why it departs</Heading>
          <Text>{assembly.reason}</Text>
        </Stack>
      ) : null}
      {notes.map((note) => (
        <Text key={note} size="small" tone="inkSoft">
          {note}
        </Text>
      ))}
      <Text size="small" tone="inkSoft">{`Engine ${study.engineVersion}, ${methodWords[study.method]}.`}</Text>
    </Stack>
  );
}
