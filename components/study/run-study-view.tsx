import { useState } from 'react';
import { StyleSheet, View } from 'react-native';

import { space } from '@/components/theme/tokens';
import { useLayout } from '@/components/theme/use-layout';
import { Notice } from '@/components/ui/notice';
import { Row, Rule, Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';

import { cautionsOf, standingCaution } from './cautions';
import type { Deciding } from './choices';
import { CurveKey } from './curve-key';
import { JudgedAt } from './judged-at';
import { MainActions } from './main-actions';
import { OtherActions } from './other-actions';
import type { Standing } from './put-up';
import { SectionDetail } from './section-detail';
import { StudySentence } from './study-sentence';
import { WhyNotThinner } from './why-not-thinner';
import { WorkingDialog } from './working-dialog';
import { DrawnStrip } from '@/components/drawing/drawn';
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
      <CurveKey runStudy={runStudy} />
      <View style={isPhone ? styles.bleed : null}>
        <DrawnStrip {...{ runStudy, standing, selected, onSelect }} />
      </View>
      {isPhone ? (
        <OtherActions of={of} title={title} standing={standing} mayEdit={mayEdit} />
      ) : (
        <Row>
          {mayEdit ? <MainActions of={of} standing={standing} selected={selected} /> : null}
          <OtherActions of={of} title={title} standing={standing} mayEdit={mayEdit} />
        </Row>
      )}
      <Rule />
      <View style={styles.beside}>
        <View style={styles.judged}>{candidate ? <JudgedAt candidate={candidate} onWorking={setAbout} /> : null}</View>
        <View style={styles.why}>
          <WhyNotThinner runStudy={runStudy} />
          <SectionDetail runStudy={runStudy} selected={selected} />
          <Cautions {...{ of, row }} />
        </View>
      </View>
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

const styles = StyleSheet.create({
  bleed: { marginHorizontal: -space.md },
  beside: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.xl, rowGap: space.lg },
  judged: { flexGrow: 3, flexShrink: 1, flexBasis: 400, minWidth: 0, maxWidth: 720 },
  why: { flexGrow: 2, flexShrink: 1, flexBasis: 290, minWidth: 0, maxWidth: 560, gap: space.lg },
});
