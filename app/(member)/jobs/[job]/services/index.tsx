import { useLocalSearchParams } from 'expo-router';

import { SectionScreen } from '@/components/job/section-screen';
import { ServiceTable } from '@/components/service/service-table';
import { useServices } from '@/hooks/use-services';

export default function ServicesScreen() {
  const { job } = useLocalSearchParams<'/jobs/[job]/services'>();
  const { services = [] } = useServices(job);
  return (
    <SectionScreen jobId={job} title="Services">
      <ServiceTable jobId={job} services={services} />
    </SectionScreen>
  );
}
