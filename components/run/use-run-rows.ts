import { useBasis } from '@/hooks/use-basis';
import { useJudgement } from '@/hooks/use-judgement';
import { usePipeSizes } from '@/hooks/use-library';
import { usePlaces } from '@/hooks/use-places';
import { useRuns } from '@/hooks/use-runs';
import { useServices } from '@/hooks/use-services';

import { joinRuns, type RunLookups } from './run-row';

/** A job's runs with all that stands beside them, in the order in which they were entered; undefined until everything is there. */
export function useRunRows(jobId: string) {
  const runs = useRuns(jobId);
  const judgement = useJudgement(jobId);
  const services = useServices(jobId);
  const places = usePlaces(jobId);
  const basis = useBasis(jobId);
  const sizes = usePipeSizes();
  const problem = [runs, services, places, basis, sizes].find((one) => one.problem)?.problem ?? judgement.problem;
  const lookups = toLookups(services.services, places.places, { ...basis, pipeSizes: sizes.data });
  const rows = runs.runs && lookups ? joinRuns(runs.runs, judgement.judgement, lookups) : undefined;
  const reload = () => [runs, judgement, services, places, sizes].forEach((one) => one.reload());
  return { rows, lookups, problem, reload };
}

type Rest = { levels?: RunLookups['levels']; drawings?: RunLookups['drawings']; pipeSizes?: RunLookups['pipeSizes'] };

function toLookups(
  services: RunLookups['services'] | undefined,
  places: RunLookups['places'] | undefined,
  { levels, drawings, pipeSizes }: Rest,
): RunLookups | undefined {
  if (!services || !places || !levels || !drawings || !pipeSizes) return undefined;
  return { services, places, levels, drawings, pipeSizes };
}
