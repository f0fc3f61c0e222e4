import { useLocalSearchParams } from 'expo-router';

import { RowScreen } from '@/components/job/row-screen';
import { MaterialDetail } from '@/components/library/material-detail';
import { useMaterials, useSeries } from '@/hooks/use-library';

export default function MaterialScreen() {
  const { material: id } = useLocalSearchParams<'/library/materials/[material]'>();
  const { data, problem, reload } = useMaterials();
  const { data: series = [] } = useSeries();
  return (
    <RowScreen
      noun="material"
      id={`std/${id}`}
      rows={data}
      problem={problem}
      onRetry={reload}
      titleOf={({ name }) => name}
      back={{ href: '/library/materials', label: 'Materials' }}
    >
      {(material) => <MaterialDetail material={material} series={series} />}
    </RowScreen>
  );
}
