import type { LibraryCode } from '@/api/contracts/library';
import { Disclosure } from '@/components/ui/disclosure';
import { Heading } from '@/components/ui/heading';
import { Notice } from '@/components/ui/notice';
import { Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';

import { DuctTables } from './code-duct-tables';
import { PipeBandTable } from './code-pipe-table';
import { SourceLine } from './source-line';

const endWords: Record<LibraryCode['end'], string> = {
  upper: 'Where a material conducts outside of the range, the thickness is adjusted with the upper end of the range.',
  lower: 'Where a material conducts outside of the range, the thickness is adjusted with the lower end of the range.',
};

/** A code edition's tables, as they are judged by. */
export function CodeDetail({ code }: { code: LibraryCode }) {
  const { pipes, end, endSource, endConfidence, ducts, footnotes, exemptions } = code;
  return (
    <Stack gap="lg">
      <Notice>
        Entered from its sources, not from the adopted text: verify it against the edition and the amendments that hold
        where the job is. The authority having jurisdiction decides.
      </Notice>
      <Stack gap="sm">
        <Heading>{`Pipes: ${pipes.name}`}</Heading>
        <PipeBandTable pipes={pipes} />
        <SourceLine source={pipes.source} confidence={pipes.confidence} />
        <Text>{endWords[end]}</Text>
        <SourceLine source={endSource} confidence={endConfidence} />
      </Stack>
      {ducts ? <DuctTables ducts={ducts} /> : <Text>No duct table of this edition is entered.</Text>}
      <Lines title="What its tables leave out" exemptions={[...exemptions, ...(ducts?.exemptions ?? [])]} />
      <Disclosure summary={<Text weight="strong">Footnotes</Text>}>
        <Stack gap="xs" role="list">
          {footnotes.map((note) => (
            <Text key={note} role="listitem">
              {note}
            </Text>
          ))}
        </Stack>
      </Disclosure>
    </Stack>
  );
}

type LinesProps = { title: string; exemptions: LibraryCode['exemptions'] };

function Lines({ title, exemptions }: LinesProps) {
  if (exemptions.length === 0) return null;
  return (
    <Disclosure summary={<Text weight="strong">{title}</Text>}>
      <Stack gap="sm" role="list">
        {exemptions.map(({ id, what, answer, clause, source, confidence }) => (
          <Stack key={id} gap="xxs" role="listitem">
            <Text>{`${what}: ${answer}`}</Text>
            <SourceLine of={clause || undefined} source={source} confidence={confidence} />
          </Stack>
        ))}
      </Stack>
    </Disclosure>
  );
}
