import { useLocalSearchParams } from 'expo-router';

import { RowScreen } from '@/components/job/row-screen';
import { ServiceDetail } from '@/components/service/service-detail';
import { useServices } from '@/hooks/use-services';

export default function ServiceScreen() {
  const { job, service: id } = useLocalSearchParams<'/jobs/[job]/services/[service]'>();
  const { services, problem, reload } = useServices(job);
  const back = { href: `/jobs/${job}/services`, label: 'Services' } as const;
  return (
    <RowScreen
      noun="service"
      id={id}
      rows={services}
      problem={problem}
      onRetry={reload}
      titleOf={({ name }) => name}
      back={back}
    >
      {(service) => <ServiceDetail key={id} jobId={job} service={service} />}
    </RowScreen>
  );
}
