import { JobEditor } from '@/components/job/job-editor';
import { Notice } from '@/components/ui/notice';
import { Screen } from '@/components/ui/screen';
import { useMay } from '@/hooks/use-session';

export default function NewJobScreen() {
  const mayEdit = useMay('edit-jobs');
  return (
    <Screen title="New job" back={{ href: '/jobs', label: 'Jobs' }} narrow>
      {mayEdit ? <JobEditor job={null} /> : <Notice>An estimator of your firm opens jobs.</Notice>}
    </Screen>
  );
}
