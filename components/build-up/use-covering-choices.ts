import { useFinishes, useMaterials, useSeries } from '@/hooks/use-library';
import { useJob } from '@/hooks/use-job';
import { useUnits } from '@/hooks/use-units';

import type { CoveringChoices } from './covering-fields';
import { useCoveringNames } from './use-covering-names';

/** Everything that a build-up or a specification row is chosen from; undefined until all of it is read. */
export function useCoveringChoices(jobId: string): CoveringChoices | undefined {
  const { units } = useUnits();
  const { job } = useJob(jobId);
  const { names } = useCoveringNames(jobId);
  const { data: materials } = useMaterials();
  const { data: series } = useSeries();
  const { data: finishes } = useFinishes();
  if (!job || !names || !materials || !series || !finishes) return undefined;
  const library = { materials, series, units, seriesUnit: job.seriesUnit };
  return { names, library, finishes, services: names.services };
}
