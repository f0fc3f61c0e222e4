import { useState } from 'react';

import { LibraryScreen } from '@/components/library/library-screen';
import { PipeTable } from '@/components/library/pipe-table';
import { Select } from '@/components/ui/select';
import { usePipeSizes } from '@/hooks/use-library';

export default function PipesScreen() {
  const { data, problem, reload } = usePipeSizes();
  const [standard, setStandard] = useState('asme-steel');
  const standards = [...new Map(data?.map((size) => [size.standard, size.standardTitle])).entries()];
  return (
    <LibraryScreen
      title="Pipes and tubes"
      lead="A size is a standard and a nominal: DN 65 is 73.0 mm outside in one and 76.1 mm in another."
      rows={data?.filter((size) => size.standard === standard)}
      problem={problem}
      onRetry={reload}
      noun="a size"
      wordsOf={({ nominal, dn }) => [nominal, `DN ${dn ?? ''}`]}
      filter={
        <Select
          label="Standard"
          value={standard}
          options={standards.map(([value, label]) => ({ value, label }))}
          onChange={setStandard}
        />
      }
    >
      {(sizes) => <PipeTable sizes={sizes} />}
    </LibraryScreen>
  );
}
