import type { Place } from '@/api/contracts/place';
import type { Service } from '@/api/contracts/service';
import { useFinishes, useMaterials, usePipeSizes } from '@/hooks/use-library';
import { usePlaces } from '@/hooks/use-places';
import { useServices } from '@/hooks/use-services';
import { useUnits } from '@/hooks/use-units';

import type { CoveringNames } from './covering-words';

type RowsAndNames = CoveringNames & { services: readonly Service[]; places: readonly Place[] };

/** What a job's rows name by id; undefined until all of it is read. */
export function useCoveringNames(jobId: string): { names: RowsAndNames | undefined; problem: ReadProblem } {
  const { units } = useUnits();
  const { services, problem: noServices } = useServices(jobId);
  const { places, problem: noPlaces } = usePlaces(jobId);
  const { data: materials, problem: noMaterials } = useMaterials();
  const { data: finishes, problem: noFinishes } = useFinishes();
  const { data: pipeSizes, problem: noSizes } = usePipeSizes();
  const problem = noServices ?? noPlaces ?? noMaterials ?? noFinishes ?? noSizes;
  if (!services || !places || !materials || !finishes || !pipeSizes) return { names: undefined, problem };
  const sizes = pipeSizes.flatMap(({ standard, dn, nominal, outsideDiameter }) =>
    standard === 'asme-steel' && dn !== null ? [{ dn, nominal, outsideDiameter }] : [],
  );
  return { names: { units, services, places, materials, finishes, sizes }, problem };
}

type ReadProblem = ReturnType<typeof useServices>['problem'];
