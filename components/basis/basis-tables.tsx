import type { Addendum, Drawing, Level } from '@/api/contracts/basis';
import { dateText } from '@/components/job/due-words';
import { DataTable, type Column } from '@/components/ui/data-table';
import { Mark } from '@/components/ui/mark';
import { Text } from '@/components/ui/text';

const drawingColumns: readonly Column<Drawing>[] = [
  { key: 'number', label: 'Number', cell: ({ number }) => number },
  { key: 'title', label: 'Title', cell: ({ title }) => <Text>{title}</Text> },
  { key: 'revision', label: 'Revision', cell: ({ revision }) => <Text>{revision}</Text> },
  { key: 'date', label: 'Date of issue', cell: ({ date }) => <Text>{date ? dateText(date) : ''}</Text> },
  { key: 'scale', label: 'Scale as printed', cell: ({ scale }) => <Text numeric>{scale}</Text> },
];

const byNumber = (a: Drawing, b: Drawing) => a.number.localeCompare(b.number, 'en', { numeric: true });

export const DrawingTable = ({ jobId, drawings }: { jobId: string; drawings: readonly Drawing[] }) => (
  <DataTable
    label="Drawings"
    columns={drawingColumns}
    rows={[...drawings].sort(byNumber)}
    keyOf={({ id }) => id}
    hrefOf={({ id }) => `/jobs/${jobId}/drawings/${id}`}
  />
);

const addendumColumns: readonly Column<Addendum>[] = [
  { key: 'number', label: 'Addendum', cell: ({ number }) => `Addendum ${number}` },
  { key: 'date', label: 'Date', cell: ({ date }) => <Text noWrap>{dateText(date)}</Text> },
  { key: 'changes', label: 'What it changes', cell: ({ changes }) => <Text>{changes}</Text> },
  {
    key: 'acknowledged',
    label: 'Acknowledged',
    cell: ({ acknowledged }) => (
      <Mark verdict={acknowledged ? 'pass' : 'caution'} words={acknowledged ? 'yes' : 'not yet'} size="body" />
    ),
  },
];

export const AddendumTable = ({ jobId, addenda }: { jobId: string; addenda: readonly Addendum[] }) => (
  <DataTable
    label="Addenda"
    columns={addendumColumns}
    rows={[...addenda].sort((a, b) => a.number - b.number)}
    keyOf={({ id }) => id}
    hrefOf={({ id }) => `/jobs/${jobId}/addenda/${id}`}
  />
);

type Counted = { level: Level; runs: number };
const levelColumns: readonly Column<Counted>[] = [
  { key: 'name', label: 'Level', cell: ({ level }) => level.name },
  { key: 'runs', label: 'Runs on it', numeric: true, cell: ({ runs }) => runs },
];

export const LevelTable = ({ jobId, levels }: { jobId: string; levels: readonly Counted[] }) => (
  <DataTable
    label="Levels"
    columns={levelColumns}
    rows={[...levels].sort((a, b) => a.level.position - b.level.position)}
    keyOf={({ level }) => level.id}
    hrefOf={({ level }) => `/jobs/${jobId}/levels/${level.id}`}
  />
);
