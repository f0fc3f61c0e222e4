import type { RunStudy } from '@/api/contracts/study';
import { wordsText } from '@/api/contracts/words-text';
import type { TypeSize } from '@/components/theme/tokens';
import { Stack } from '@/components/ui/stack';
import { Text, Words } from '@/components/ui/text';
import { useUnits } from '@/hooks/use-units';

import { candidateName } from './candidate-words';
import { leadAndRest } from './lead';
import { unbroken } from './unbroken';

const governs: Record<NonNullable<RunStudy['study']['governing']>, string> = {
  touch: 'the touch limit',
  'dew-point': 'the dew point',
  'energy-code': 'the energy code',
  'heat-flow': 'the heat-flow limit',
  material: 'the material',
};

type StudySentenceProps = { runStudy: RunStudy; size?: TypeSize };

/** What governs, and by how much, before any number; where what is up falls short, what would do. */
export function StudySentence({ runStudy: { study, used }, size = 'sentence' }: StudySentenceProps) {
  const { units } = useUnits();
  const stands = used !== null && study.candidates[used]?.meetsAll === true;
  const [lead, rest] = leadAndRest(unbroken(wordsText(study.sentence, units)));
  const remedy = study.proposed !== null && study.proposed !== used ? study.candidates[study.proposed] : undefined;
  return (
    <Stack gap="xxs">
      <Text size={size}>
        <Words tone={stands ? 'pass' : 'fail'} weight="strong">
          {lead}
        </Words>
        {rest}
      </Text>
      {remedy && !stands ? (
        <Text size={size}>
          <Words tone="pass" weight="strong">{`${candidateName(remedy, units)} meets every limit`}</Words>
          {study.governing ? `; ${governs[study.governing]} governs.` : '.'}
        </Text>
      ) : null}
    </Stack>
  );
}
