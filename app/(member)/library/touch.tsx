import { TouchDetail } from '@/components/library/touch-detail';
import { LoadingScreen } from '@/components/ui/loading-screen';
import { ProblemScreen } from '@/components/ui/problem-screen';
import { Screen } from '@/components/ui/screen';
import { useSafety } from '@/hooks/use-library';

export default function TouchScreen() {
  const { data, problem, reload } = useSafety();
  const back = { href: '/library', label: 'Library' } as const;
  if (problem && !data) return <ProblemScreen problem={problem} onRetry={reload} back={back} />;
  if (!data) return <LoadingScreen title="Touch temperatures" back={back} shape="table" />;
  return (
    <Screen title="Touch temperatures" back={back} narrow>
      <TouchDetail safety={data} />
    </Screen>
  );
}
