import { useEffect, useId } from 'react';
import { useForm, useFormState } from 'react-hook-form';
import { StyleSheet } from 'react-native';

import { signInSchema, type SignIn } from '@/api/contracts/session';
import { FormTextField } from '@/components/forms/form-text-field';
import { plainResolver } from '@/components/forms/plain-resolver';
import { problemOf } from '@/components/forms/show-problem';
import { space } from '@/components/theme/tokens';
import { webStyle } from '@/components/theme/web-style';
import { Button } from '@/components/ui/button';
import { Element } from '@/components/ui/element';
import { Notice } from '@/components/ui/notice';

type SignInFormProps = {
  /** who was here before */
  email?: string;
  /** begins in the first empty field; not on a phone, where a keyboard would come up unasked */
  focused?: boolean;
  onSignIn: (input: SignIn) => Promise<unknown>;
};

/** E-mail and password, as a password manager knows them. A refusal keeps the e-mail and empties the password. */
export function SignInForm({ email = '', focused = false, onSignIn }: SignInFormProps) {
  const id = useId();
  const { control, handleSubmit, setError, resetField, setFocus } = useForm({
    resolver: plainResolver(signInSchema),
    defaultValues: { email, password: '' },
  });
  const { errors, isSubmitting } = useFormState({ control });
  useEffect(() => {
    if (focused) setFocus(email ? 'password' : 'email');
  }, [focused, email, setFocus]);
  const submit = handleSubmit((input) =>
    onSignIn(input).catch((error: unknown) => {
      const problem = problemOf(error);
      if (!problem) throw error;
      resetField('password');
      setFocus('password');
      setError('root', { message: problem.detail ?? problem.title });
    }),
  );
  return (
    <Element
      tag="form"
      id={id}
      aria-label="Sign in"
      noValidate
      onSubmit={(event) => void submit(event)}
      style={styles.form}
    >
      {errors.root?.message ? (
        <Notice tone="fail" urgent>
          {errors.root.message}
        </Notice>
      ) : null}
      <FormTextField
        control={control}
        name="email"
        label="E-mail"
        kind="email"
        inputMode="email"
        autoComplete="username"
      />
      <FormTextField
        control={control}
        name="password"
        label="Password"
        kind="password"
        autoComplete="current-password"
      />
      <Button label="Sign in" busyLabel="Signing in" tone="action" submit busy={isSubmitting} />
    </Element>
  );
}

const styles = StyleSheet.create({
  form: webStyle({ display: 'flex', flexDirection: 'column', gap: space.md, margin: 0 }),
});
