import type { Action } from '@/components/ui/action-button';
import { useRuns } from '@/hooks/use-runs';
import { useMay } from '@/hooks/use-session';

import type { JobSection } from './sections';
import { useJobSections } from './use-job-sections';

/** What is to be done next in a job: the first of what a run needs that is not there, then the runs. */
export function useNextStep(jobId: string): Action | undefined {
  const mayEdit = useMay('edit-jobs');
  const { sections } = useJobSections(jobId);
  const { runs } = useRuns(jobId);
  if (!sections || !runs) return undefined;
  if (runs.length > 0 || !mayEdit) return { label: 'Open the runs', href: `/jobs/${jobId}/runs` };
  return firstMissing(sections)?.add ?? { label: 'Enter the first run', href: `/jobs/${jobId}/runs` };
}

const needed = ['Places', 'Services', 'Specification', 'Levels'];

/** A run lies on a level, in a place, carries a service, and something says how it is insulated: either of two will do. */
export function firstMissing(sections: readonly JobSection[]): JobSection | undefined {
  const isThere = (title: string) => sections.some((section) => section.title === title && section.items.length > 0);
  const lacks = needed.filter((title) => !isThere(title) && !(title === 'Specification' && isThere('Build-ups')));
  return sections.find(({ title }) => title === lacks[0]);
}
