import { View, StyleSheet } from 'react-native';

import type { Working } from '@/api/contracts/study';
import { hairline, radius, space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';
import { Dialog } from '@/components/ui/dialog';
import { Heading } from '@/components/ui/heading';
import { Loading } from '@/components/ui/loading';
import { ProblemWords } from '@/components/ui/problem-words';
import { Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';
import { useWorking, type WorkingAsked } from '@/hooks/use-study';

import { Symbols } from './symbols';
import { WorkingInputs } from './working-inputs';
import { EngineWords } from './words';

type WorkingDialogProps = { of: { jobId: string; runId: string }; asked: WorkingAsked; onClose: () => void };

/** Where a number comes from: equation, what was put in, and who says so. */
export function WorkingDialog({ of, asked, onClose }: WorkingDialogProps) {
  const { working, problem, reload } = useWorking(of, asked);
  return (
    <Dialog title={working?.title ?? problem?.title ?? 'The working'} width="wide" onClose={onClose}>
      {problem ? <ProblemWords problem={problem} onRetry={reload} /> : null}
      {working ? <Steps working={working} /> : null}
      {!working && !problem ? <Loading label="The working" shape="list" /> : null}
    </Dialog>
  );
}

function Steps({ working }: { working: Working }) {
  return (
    <Stack gap="lg">
      {working.steps.map((step, index) => (
        <Step key={`${index} ${step.title}`} step={step} number={index + 1} />
      ))}
      <Stack gap="xxs">
        {working.notes.map((note) => (
          <Text key={note} size="small" tone="inkSoft">
            {note}
          </Text>
        ))}
        <Text size="small" tone="inkSoft">{`Engine ${working.engineVersion}`}</Text>
      </Stack>
    </Stack>
  );
}

function Step({ step, number }: { step: Working['steps'][number]; number: number }) {
  const theme = useTheme();
  return (
    <Stack gap="xs">
      <Heading level={3}>{`${number}. ${step.title}`}</Heading>
      <View style={[styles.equation, { backgroundColor: theme.paper, borderColor: theme.rule }]}>
        <Text size="lead">
          <Symbols>{step.equation}</Symbols>
        </Text>
        <Text numeric>
          <EngineWords words={step.filled} />
        </Text>
        <Text size="lead" weight="strong" numeric>
          <EngineWords words={step.result} />
        </Text>
      </View>
      {step.inputs.length > 0 ? <WorkingInputs inputs={step.inputs} /> : null}
      {step.source ? (
        <Text size="small" tone="inkSoft">
          {step.source}
        </Text>
      ) : null}
    </Stack>
  );
}

const styles = StyleSheet.create({
  equation: { padding: space.sm, gap: space.xxs, borderWidth: hairline, borderRadius: radius.sm },
});
