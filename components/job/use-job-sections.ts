import { useCoveringNames } from '@/components/build-up/use-covering-names';
import { useBasis } from '@/hooks/use-basis';
import { useBuildUps } from '@/hooks/use-build-ups';
import { useSpecification } from '@/hooks/use-specification';

import {
  addendaSection,
  buildUpsSection,
  drawingsSection,
  levelsSection,
  placesSection,
  servicesSection,
  specificationSection,
  type JobSection,
} from './sections';

/** All that a job holds besides its runs; undefined until it is read. */
export function useJobSections(jobId: string): { sections: JobSection[] | undefined; problem: ReadProblem } {
  const { names, problem: unnamed } = useCoveringNames(jobId);
  const { buildUps, problem: noBuildUps } = useBuildUps(jobId);
  const { specification, problem: noSpecification } = useSpecification(jobId);
  const { levels, drawings, addenda, problem: noBasis } = useBasis(jobId);
  const problem = unnamed ?? noBuildUps ?? noSpecification ?? noBasis;
  if (!names || !buildUps || !specification || !levels || !drawings || !addenda)
    return { sections: undefined, problem };
  const sections = [
    placesSection(jobId, names.places, names),
    servicesSection(jobId, names.services, names),
    specificationSection(jobId, { specification, buildUps, services: names.services }, names),
    buildUpsSection(jobId, buildUps, names),
    levelsSection(jobId, levels),
    drawingsSection(jobId, drawings),
    addendaSection(jobId, addenda),
  ];
  return { sections, problem };
}

type ReadProblem = ReturnType<typeof useCoveringNames>['problem'];
