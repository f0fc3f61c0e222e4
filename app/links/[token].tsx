import { useLocalSearchParams } from 'expo-router';

import { LinkPage } from '@/components/link/link-page';
import { LoadingScreen } from '@/components/ui/loading-screen';
import { ProblemScreen } from '@/components/ui/problem-screen';
import { useLink } from '@/hooks/use-link';

export default function LinkScreen() {
  const { token } = useLocalSearchParams<{ token: string }>();
  const { link, problem, reload } = useLink(token);
  if (problem && !link)
    return <ProblemScreen problem={problem} onRetry={problem.status === 404 ? undefined : reload} />;
  if (!link) return <LoadingScreen title="Opening" />;
  return <LinkPage token={token} link={link} />;
}
