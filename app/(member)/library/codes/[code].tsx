import { useLocalSearchParams } from 'expo-router';

import { RowScreen } from '@/components/job/row-screen';
import { CodeDetail } from '@/components/library/code-detail';
import { useCodes } from '@/hooks/use-library';

export default function CodeScreen() {
  const { code: id } = useLocalSearchParams<'/library/codes/[code]'>();
  const { data, problem, reload } = useCodes();
  return (
    <RowScreen
      noun="code edition"
      id={id}
      rows={data}
      problem={problem}
      onRetry={reload}
      titleOf={({ title }) => title}
      back={{ href: '/library/codes', label: 'Energy codes' }}
      isAlone
    >
      {(code) => <CodeDetail code={code} />}
    </RowScreen>
  );
}
