import { useBuildUps } from '@/hooks/use-build-ups';
import { useRuns } from '@/hooks/use-runs';
import { useServices } from '@/hooks/use-services';
import { useSpecification } from '@/hooks/use-specification';

import { usesOf, type Used } from './uses';

/** What of the job stands on a row, as far as it is read. */
export function useUses(jobId: string, used: Used): string[] {
  const { runs } = useRuns(jobId);
  const { buildUps } = useBuildUps(jobId);
  const { specification } = useSpecification(jobId);
  const { services } = useServices(jobId);
  return usesOf({ runs, buildUps, specification, services }, used);
}
