import { libraryParts } from '@/components/library/library-parts';
import { ListRows } from '@/components/ui/list-row';
import { Screen } from '@/components/ui/screen';

export default function LibraryScreen() {
  const items = libraryParts.map((part) => ({ key: part.title, ...part }));
  return (
    <Screen
      title="Library"
      lead="What every calculation stands on, each row with its source and how far it can be trusted."
      narrow
    >
      <ListRows label="Library" items={items} flush />
    </Screen>
  );
}
