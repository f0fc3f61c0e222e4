import { useState } from 'react';
import { View } from 'react-native';

import type { RunStudy } from '@/api/contracts/study';
import type { RunRow } from '@/components/run/run-row';
import { useLayout } from '@/components/theme/use-layout';
import { Screen } from '@/components/ui/screen';
import { Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';
import { useMay } from '@/hooks/use-session';
import { useSpecification } from '@/hooks/use-specification';
import { useUnits } from '@/hooks/use-units';

import { firstSelected } from './choices';
import { MainActions } from './main-actions';
import { rowOf, standingOf } from './put-up';
import { RunStudyView } from './run-study-view';
import { useRunHead } from './use-run-head';
import { assemblyText, natureOf } from './run-words';
import { StudySentence } from './study-sentence';
import type { Neighbours } from './neighbours';

type StudyScreenProps = { jobId: string; row: RunRow; runStudy: RunStudy; neighbours: Neighbours };

/** A run with its study; on a phone the sentence and the decision stay in sight at the foot. */
export function StudyScreen({ jobId, row, neighbours, ...given }: StudyScreenProps) {
  const runStudy = { ...given.runStudy, nature: natureOf(row) };
  const { units } = useUnits();
  const { isPhone } = useLayout();
  const mayEdit = useMay('edit-jobs');
  const { specification } = useSpecification(jobId);
  const [chosen, setChosen] = useState<number>();
  const last = runStudy.study.candidates.length - 1;
  const selected = Math.min(chosen ?? firstSelected(runStudy), last);
  const handedDown = rowOf(runStudy, specification, row.run.serviceId);
  const standing = standingOf(runStudy, handedDown);
  const of = { jobId, run: row.run, runStudy, row: handedDown };
  const head = useRunHead({ jobId, row, neighbours });
  const lead = (
    <Text size={isPhone ? 'small' : 'body'} tone="inkSoft">
      {assemblyText(runStudy, units)}
    </Text>
  );
  const foot = (
    <View style={{ flexGrow: 1, flexBasis: '100%' }}>
      <Stack gap="xs">
        <StudySentence runStudy={runStudy} size="lead" />
        {mayEdit ? <MainActions of={of} standing={standing} selected={selected} full /> : null}
      </Stack>
    </View>
  );
  return (
    <Screen {...head} lead={lead} footer={isPhone ? foot : undefined}>
      <RunStudyView {...{ of, row, title: head.title, standing, selected, mayEdit }} onSelect={setChosen} />
    </Screen>
  );
}
