import type { Candidate, LimitVerdict, Study, Working } from '@/api/contracts/study';
import type * as engine from '@/api/engine/limits/study-types';

/** The contract's shapes are the engine's, both ways: the compiler is the check, the run only says that it compiled. */
type Same<Left, Right> = [Left, Right] extends [Right, Left] ? true : false;

it('has one shape for a study in engine and contract', () => {
  const study: Same<engine.Study, Study> = true;
  const candidate: Same<engine.Candidate, Candidate> = true;
  const verdict: Same<engine.LimitVerdict, LimitVerdict> = true;
  const working: Same<engine.Working, Working> = true;
  expect([study, candidate, verdict, working]).toEqual([true, true, true, true]);
});
