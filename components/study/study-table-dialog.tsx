import { Button } from '@/components/ui/button';
import { DataTable } from '@/components/ui/data-table';
import { Dialog } from '@/components/ui/dialog';
import { Text } from '@/components/ui/text';
import { useToast } from '@/components/ui/toast';
import { useUnits } from '@/hooks/use-units';

import type { Standing } from './put-up';
import { studyTable, tableNotes, tableText, type StudyTable } from './study-table';
import type { StudiedRun } from './study-facts';

type Row = StudyTable['rows'][number];
type StudyTableDialogProps = { title: string; runStudy: StudiedRun; standing: Standing; onClose: () => void };

export function StudyTableDialog({ title, runStudy, standing, onClose }: StudyTableDialogProps) {
  const { units } = useUnits();
  const toast = useToast();
  const told = { runStudy, standing, units };
  const table = studyTable(told);
  const notes = tableNotes(told);
  const copy = () =>
    navigator.clipboard.writeText([tableText(table), ...notes].join('\n')).then(
      () => toast({ text: 'The table is on the clipboard.' }),
      () => toast({ text: 'This browser does not let the table be copied: select it by hand.' }),
    );
  return (
    <Dialog title={title} width="full" onClose={onClose} footer={<Button label="Copy the table" onPress={copy} />}>
      <DataTable
        label={title}
        columns={table.columns.map((column, index) => ({ ...column, cell: ({ cells }: Row) => cells[index] ?? '' }))}
        rows={table.rows}
        keyOf={({ key }) => key}
      />
      {notes.map((note) => (
        <Text key={note} size="small" tone="inkSoft">
          {note}
        </Text>
      ))}
    </Dialog>
  );
}
