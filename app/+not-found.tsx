import { Main } from '@/components/ui/main';
import { ProblemScreen } from '@/components/ui/problem-screen';

export default function NotFoundScreen() {
  const problem = {
    title: 'There is nothing here',
    status: 404,
    detail: 'The address is not one of Thickset’s. It may have been mistyped, or cut off on its way here.',
  };
  return (
    <Main>
      <ProblemScreen problem={problem} />
    </Main>
  );
}
