import { useRouter } from 'expo-router';

import type { SignIn } from '@/api/contracts/session';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Text } from '@/components/ui/text';
import { useSignIn } from '@/hooks/use-session';

import { SignInForm } from './sign-in-form';

/** The session ended over work that is not saved: signing in again right here keeps it. */
export function SessionEnded({ email }: { email: string }) {
  const router = useRouter();
  const { signIn } = useSignIn();
  const leave = () => router.replace('/sign-in');
  const again = async (input: SignIn) => {
    const { samePerson } = await signIn(input);
    if (!samePerson) router.replace('/jobs');
  };
  return (
    <Dialog
      title="Your session has ended"
      question
      onClose={() => undefined}
      footer={<Button label="Leave without saving" onPress={leave} />}
    >
      <Text>Sign in again: what you have not saved is still here.</Text>
      <SignInForm email={email} focused onSignIn={again} />
    </Dialog>
  );
}
