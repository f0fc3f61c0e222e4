import { useLocalSearchParams } from 'expo-router';

import { RowScreen } from '@/components/job/row-screen';
import { codeSlug } from '@/components/library/code-address';
import { CodeDetail } from '@/components/library/code-detail';
import { useCodes } from '@/hooks/use-library';

export default function CodeScreen() {
  const { code: slug } = useLocalSearchParams<'/library/codes/[code]'>();
  const { data, problem, reload } = useCodes();
  return (
    <RowScreen
      noun="code edition"
      id={data?.find((one) => codeSlug(one.id) === slug)?.id ?? slug}
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
