import { Slot, useGlobalSearchParams } from 'expo-router';

import { useIsOpen } from '@/components/job/use-row-routes';
import { materialItems } from '@/components/library/material-list';
import { ListBeside } from '@/components/ui/list-beside';
import { ListPane } from '@/components/ui/list-pane';
import { useMaterials } from '@/hooks/use-library';
import { useUnits } from '@/hooks/use-units';

export default function MaterialsLayout() {
  const { material } = useGlobalSearchParams<{ material?: string }>();
  const { data = [] } = useMaterials();
  const { units } = useUnits();
  const list = (
    <ListPane
      title="Materials"
      href="/library/materials"
      items={materialItems(data, units).map((item) => ({ ...item, text: undefined }))}
      chosen={material ? `std/${material}` : undefined}
    />
  );
  return (
    <ListBeside isOpen={useIsOpen('materials')} list={list}>
      <Slot />
    </ListBeside>
  );
}
