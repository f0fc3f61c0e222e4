import { useLocalSearchParams, useRouter } from 'expo-router';

import type { SignIn } from '@/api/contracts/session';
import { nextPlace } from '@/components/session/next-place';
import { SignInPage } from '@/components/session/sign-in-page';
import { useSignIn } from '@/hooks/use-session';

export default function SignInScreen() {
  const router = useRouter();
  const { next } = useLocalSearchParams();
  const { signIn } = useSignIn();
  const enter = async (input: SignIn) => {
    await signIn(input);
    router.replace(nextPlace(next));
  };
  return <SignInPage onSignIn={enter} />;
}
