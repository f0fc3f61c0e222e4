import { useJob } from '@/hooks/use-job';
import { useCodes } from '@/hooks/use-library';

/** Where a duct can lie, by the duct table of the job's code edition; none where it has no such table. */
export function useDuctLocations(jobId: string): readonly { id: string; words: string }[] | undefined {
  const { job } = useJob(jobId);
  const { data: codes } = useCodes();
  if (!job || !codes) return undefined;
  return codes.find(({ id }) => id === job.codeEdition)?.ducts?.locations ?? [];
}
