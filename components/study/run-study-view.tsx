import { useState } from 'react';
import { StyleSheet, View } from 'react-native';

import { space } from '@/components/theme/tokens';
import { useLayout } from '@/components/theme/use-layout';
import { Notice } from '@/components/ui/notice';
import { Grid, Rule, Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';

import { cautionsOf, standingCaution } from './cautions';
import type { Deciding } from './choices';
import { CurveKey } from './curve-key';
import { JudgedAt } from './judged-at';
import { MainActions } from './main-actions';
import { OtherActions } from './other-actions';
import type { Standing } from './put-up';
import { StudySentence } from './study-sentence';
import { ThicknessStrip } from './thickness-strip';
import { WhyNotThinner } from './why-not-thinner';
import { WorkingDialog } from './working-dialog';
import type { RunRow } from '@/components/run/run-row';

type RunStudyViewProps = {
  of: Deciding;
  row: RunRow;
  title: string;
  standing: Standing;
  selected: number;
  onSelect: (place: number) => void;
  mayEdit: boolean;
};

/** The heart: the sentence, the strip, the decision; below it what it was judged at and why no less. */
export function RunStudyView({ of, row, title, standing, selected, onSelect, mayEdit }: RunStudyViewProps) {
  const { isPhone } = useLayout();
  const [about, setAbout] = useState<string>();
  const { runStudy } = of;
  const candidate = runStudy.study.candidates[selected];
  return (
    <Stack gap="md">
      {isPhone ? null : <StudySentence runStudy={runStudy} />}
      <CurveKey study={runStudy.study} />
      <View style={isPhone ? styles.bleed : null}>
        <ThicknessStrip {...{ runStudy, standing, selected, onSelect }} />
      </View>
      {isPhone || !mayEdit ? null : <MainActions of={of} standing={standing} selected={selected} />}
      <OtherActions of={of} title={title} standing={standing} mayEdit={mayEdit} />
      <Rule />
      <Grid gap="xl" column={340}>
        {candidate ? <JudgedAt candidate={candidate} onWorking={setAbout} /> : null}
        <Stack gap="md">
          <WhyNotThinner runStudy={runStudy} />
          <Cautions {...{ of, row }} />
        </Stack>
      </Grid>
      {about ? (
        <WorkingDialog
          of={{ jobId: of.jobId, runId: of.run.id }}
          asked={{ candidate: selected, about }}
          onClose={() => setAbout(undefined)}
        />
      ) : null}
    </Stack>
  );
}

function Cautions({ of: { runStudy }, row: { place, service } }: Pick<RunStudyViewProps, 'of' | 'row'>) {
  return (
    <>
      {cautionsOf({ runStudy, place, service }).map(({ key, title, text }) => (
        <Notice key={key} title={title}>
          {text}
        </Notice>
      ))}
      <Text size="small" tone="inkSoft">
        {standingCaution}
      </Text>
    </>
  );
}

const styles = StyleSheet.create({ bleed: { marginHorizontal: -space.md } });
