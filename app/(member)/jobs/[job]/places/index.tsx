import { useLocalSearchParams } from 'expo-router';

import { SectionScreen } from '@/components/job/section-screen';
import { PlaceTable } from '@/components/place/place-table';
import { usePlaces } from '@/hooks/use-places';

export default function PlacesScreen() {
  const { job } = useLocalSearchParams<'/jobs/[job]/places'>();
  const { places = [] } = usePlaces(job);
  return (
    <SectionScreen jobId={job} title="Places">
      <PlaceTable jobId={job} places={places} />
    </SectionScreen>
  );
}
