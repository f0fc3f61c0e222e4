import { useWatch, type UseFormReturn } from 'react-hook-form';

import type { PlaceInput } from '@/api/contracts/place';
import { Text } from '@/components/ui/text';
import { dewPointOf } from '@/hooks/dew-point';
import { useUnits } from '@/hooks/use-units';

/** What the most humid air means for a cold pipe: below this it sweats. */
export function DewPointLine({ control }: Pick<UseFormReturn<PlaceInput>, 'control'>) {
  const { showWithUnit } = useUnits();
  const [air, humidity] = useWatch({
    control,
    name: ['conditions.mostHumid.air.value', 'conditions.mostHumid.humidity.value'],
  });
  const dewPoint = dewPointOf(air, humidity);
  return (
    <Text size="small" tone="inkSoft">
      {dewPoint === null
        ? 'dew point, with the fluid at its coldest'
        : `dew point ${showWithUnit('temperature', dewPoint)}`}
    </Text>
  );
}
