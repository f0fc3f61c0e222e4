import { useState } from 'react';

import { problemOf } from '@/components/forms/show-problem';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { Row, Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';
import { useUnits } from '@/hooks/use-units';

import { candidateName } from './candidate-words';
import { choicesOf, type Deciding } from './choices';
import { thicknessAsSpecified } from './override';
import type { Standing } from './put-up';
import { ThicknessDialog } from './thickness-dialog';
import { useDepartures } from './use-departures';

type MainActionsProps = { of: Deciding; standing: Standing; selected: number; full?: boolean };
type Asked = { place: number; title: string };

/** The decision: the selected thickness goes up, or what falls short stays with a reason. */
export function MainActions({ of, standing, selected, full }: MainActionsProps) {
  const { units } = useUnits();
  const [asked, setAsked] = useState<Asked>();
  const [problem, setProblem] = useState<string>();
  const depart = useDepartures(of.jobId);
  const { use, keep } = choicesOf(of, standing, selected);
  const nameOf = (place: number) => candidateName(of.runStudy.study.candidates[place] ?? { names: [] }, units);
  const put = (place: number) => {
    setProblem(undefined);
    const said = `${of.run.number} is at ${nameOf(place)}, as specified.`;
    depart(of.run, thicknessAsSpecified(of.run), said).catch((error: unknown) => setProblem(notSaved(error)));
  };
  const ask = (verb: string, place: number) => setAsked({ place, title: `${verb} ${nameOf(place)}` });
  return (
    <Stack gap="xs">
      {problem ? (
        <Notice tone="fail" title="Not saved" urgent>
          {problem}
        </Notice>
      ) : null}
      <Row>
        {use ? (
          <Button
            label={`Use ${nameOf(use.place)}`}
            tone={use.isDue ? 'action' : 'quiet'}
            full={full}
            onPress={() => (use.asSpecified ? put(use.place) : ask('Use', use.place))}
          />
        ) : null}
        {keep === null ? null : (
          <Button
            label={full ? `Keep ${nameOf(keep)}` : `Keep ${nameOf(keep)}, with a reason`}
            onPress={() => ask('Keep', keep)}
          />
        )}
        {selected === of.runStudy.used ? <Text tone="inkSoft">{`${nameOf(selected)} is what goes up.`}</Text> : null}
      </Row>
      {asked ? <ThicknessDialog of={of} {...asked} onClose={() => setAsked(undefined)} /> : null}
    </Stack>
  );
}

export const notSaved = (error: unknown): string =>
  problemOf(error)?.detail ?? 'The change did not reach the server. Try again.';
