import { LibraryScreen } from '@/components/library/library-screen';
import { SeriesList } from '@/components/library/series-list';
import { useSeries } from '@/hooks/use-library';

export default function ThicknessesScreen() {
  const { data, problem, reload } = useSeries();
  return (
    <LibraryScreen
      title="Made thicknesses"
      lead="A thickness is a name: 2 in and 50 mm are two things, however alike they measure."
      rows={data}
      problem={problem}
      onRetry={reload}
      narrow
      noun="a series"
      wordsOf={({ title, form, note }) => [title, form, note]}
    >
      {(series) => <SeriesList series={series} />}
    </LibraryScreen>
  );
}
