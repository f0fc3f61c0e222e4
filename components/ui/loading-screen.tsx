import { Loading, type Shape } from './loading';
import { Screen, type ScreenProps } from './screen';

type LoadingScreenProps = Pick<ScreenProps, 'title' | 'back'> & { shape?: Shape };

export function LoadingScreen({ title, back, shape }: LoadingScreenProps) {
  return (
    <Screen title={title} back={back}>
      <Loading label={title} shape={shape} />
    </Screen>
  );
}
