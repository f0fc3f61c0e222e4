import { Main } from './main';
import { ProblemScreen } from './problem-screen';

/** A screen broke: said in words, with the browser's own words for whoever mends it. */
export function Crash({ message, onRetry }: { message: string; onRetry: () => void }) {
  const problem = {
    title: 'This screen broke',
    status: 500,
    detail: 'What was saved before is kept. Try again, or go back to the jobs.',
    reference: message,
  };
  return (
    <Main>
      <ProblemScreen problem={problem} onRetry={onRetry} />
    </Main>
  );
}
