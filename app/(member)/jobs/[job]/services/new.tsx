import { useLocalSearchParams } from 'expo-router';

import { NewRowScreen } from '@/components/job/row-screen';
import { ServiceDetail } from '@/components/service/service-detail';
import { Loading } from '@/components/ui/loading';
import { useServices } from '@/hooks/use-services';

export default function NewServiceScreen() {
  const { job, from } = useLocalSearchParams<'/jobs/[job]/services/new', { from?: string }>();
  const { services } = useServices(job);
  const copyOf = services?.find(({ id }) => id === from);
  return (
    <NewRowScreen title="New service" back={{ href: `/jobs/${job}/services`, label: 'Services' }}>
      {from && !services ? (
        <Loading label="New service" shape="form" />
      ) : (
        <ServiceDetail key={from ?? 'new'} jobId={job} service={null} copyOf={copyOf} />
      )}
    </NewRowScreen>
  );
}
