import { LibraryScreen } from '@/components/library/library-screen';
import { MaterialList } from '@/components/library/material-list';
import { useMaterials } from '@/hooks/use-library';

export default function MaterialsScreen() {
  const { data, problem, reload } = useMaterials();
  return (
    <LibraryScreen
      title="Materials"
      lead="Kinds of open standards, no brands. k is read on the curve that is calculated with, at the mean temperature of a layer."
      rows={data}
      problem={problem}
      onRetry={reload}
      noun="a material"
      wordsOf={({ name, standards, useType, notes }) => [name, standards, useType, ...notes]}
    >
      {(materials) => <MaterialList materials={materials} />}
    </LibraryScreen>
  );
}
