import { useLocalSearchParams } from 'expo-router';

import type { Problem } from '@/api/contracts/problem';
import { LinkPage } from '@/components/link/link-page';
import { LoadingScreen } from '@/components/ui/loading-screen';
import { Main } from '@/components/ui/main';
import { ProblemWords } from '@/components/ui/problem-words';
import { Screen } from '@/components/ui/screen';
import { useLink } from '@/hooks/use-link';

export default function LinkScreen() {
  const { token } = useLocalSearchParams<{ token: string }>();
  const { link, problem, reload } = useLink(token);
  if (link) return <LinkPage token={token} link={link} />;
  return <Main>{problem ? <NoLink problem={problem} onRetry={reload} /> : <LoadingScreen title="Opening" />}</Main>;
}

/** Who follows a link has no account: no way leads from here into the product. */
function NoLink({ problem, onRetry }: { problem: Problem; onRetry: () => void }) {
  return (
    <Screen title={problem.title}>
      <ProblemWords problem={problem} onRetry={onRetry} />
    </Screen>
  );
}
