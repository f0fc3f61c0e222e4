import { codeHref } from '@/components/library/code-address';
import { LibraryScreen } from '@/components/library/library-screen';
import { ListRows } from '@/components/ui/list-row';
import { useCodes } from '@/hooks/use-library';

export default function CodesScreen() {
  const { data, problem, reload } = useCodes();
  return (
    <LibraryScreen
      title="Energy codes"
      lead="A job names the edition that is adopted where it is."
      rows={data}
      problem={problem}
      onRetry={reload}
      narrow
      noun="an edition"
      wordsOf={({ title, pipes, ducts }) => [title, pipes.name, ducts?.name ?? '']}
    >
      {(codes) => (
        <ListRows
          label="Energy codes"
          flush
          items={codes.map(({ id, title, pipes, ducts }) => ({
            key: id,
            title,
            text: [pipes.name, ducts?.name].filter(Boolean).join('; ducts: '),
            href: codeHref(id),
          }))}
        />
      )}
    </LibraryScreen>
  );
}
