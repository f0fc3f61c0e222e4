import { useLocalSearchParams } from 'expo-router';

import { NewRowScreen } from '@/components/job/row-screen';
import { PlaceDetail } from '@/components/place/place-detail';
import { Loading } from '@/components/ui/loading';
import { usePlaces } from '@/hooks/use-places';

export default function NewPlaceScreen() {
  const { job, from } = useLocalSearchParams<'/jobs/[job]/places/new', { from?: string }>();
  const { places } = usePlaces(job);
  const copyOf = places?.find(({ id }) => id === from);
  return (
    <NewRowScreen title="New place" back={{ href: `/jobs/${job}/places`, label: 'Places' }}>
      {from && !places ? (
        <Loading label="New place" shape="form" />
      ) : (
        <PlaceDetail key={from ?? 'new'} jobId={job} place={null} copyOf={copyOf} />
      )}
    </NewRowScreen>
  );
}
