import { LinkButton } from './link';
import { ProblemWords, type ShownProblem } from './problem-words';
import { Screen, type ScreenProps } from './screen';

type ProblemScreenProps = Pick<ScreenProps, 'back'> & { problem: ShownProblem; onRetry?: () => void };

/** Nothing can be shown: what is wrong, what was kept, and the way on. */
export function ProblemScreen({ problem, onRetry, back }: ProblemScreenProps) {
  return (
    <Screen title={problem.title} back={back}>
      <ProblemWords problem={problem} onRetry={onRetry} />
      {back ? null : <LinkButton href="/" label="To the jobs" />}
    </Screen>
  );
}
