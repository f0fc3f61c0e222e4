import { FinishList } from '@/components/library/finish-list';
import { LibraryScreen } from '@/components/library/library-screen';
import { useFinishes } from '@/hooks/use-library';

export default function FinishesScreen() {
  const { data, problem, reload } = useFinishes();
  return (
    <LibraryScreen
      title="Finishes"
      lead="Emittance: how well a surface gives off heat. Bright metal gives off little, so it gets hotter, and sweats sooner."
      rows={data}
      problem={problem}
      onRetry={reload}
      narrow
      noun="a finish"
      wordsOf={({ name, kind }) => [name, kind]}
    >
      {(finishes) => <FinishList finishes={finishes} />}
    </LibraryScreen>
  );
}
