import { useLocalSearchParams } from 'expo-router';

import { RowScreen } from '@/components/job/row-screen';
import { PlaceDetail } from '@/components/place/place-detail';
import { usePlaces } from '@/hooks/use-places';

export default function PlaceScreen() {
  const { job, place: id } = useLocalSearchParams<'/jobs/[job]/places/[place]'>();
  const { places, problem, reload } = usePlaces(job);
  const back = { href: `/jobs/${job}/places`, label: 'Places' } as const;
  return (
    <RowScreen
      noun="place"
      id={id}
      rows={places}
      problem={problem}
      onRetry={reload}
      titleOf={({ name }) => name}
      back={back}
    >
      {(place) => <PlaceDetail key={id} jobId={job} place={place} />}
    </RowScreen>
  );
}
