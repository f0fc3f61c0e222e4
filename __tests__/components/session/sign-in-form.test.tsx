import { fireEvent, render, screen, waitFor } from '@testing-library/react';
import { TextEncoder } from 'node:util';

import { SignInForm } from '@/components/session/sign-in-form';
import { RequestFailed } from '@/hooks/request';

// every browser has it, a test's document does not
Object.defineProperty(globalThis, 'TextEncoder', { value: TextEncoder });

const email = () => screen.getByLabelText<HTMLInputElement>('E-mail');
const password = () => screen.getByLabelText<HTMLInputElement>('Password');
const fill = (who: string, secret: string) => {
  fireEvent.change(email(), { target: { value: who } });
  fireEvent.change(password(), { target: { value: secret } });
};
const submit = () => fireEvent.submit(screen.getByRole('form', { name: 'Sign in' }));
const refused = (detail: string, status: number) =>
  new RequestFailed({ type: '/problems/too-many-tries', title: 'Too many tries', status, detail });

it('is known to password managers', () => {
  render(<SignInForm onSignIn={jest.fn()} />);
  expect(email().autocomplete).toBe('username');
  expect(password().autocomplete).toBe('current-password');
  expect(password().type).toBe('password');
  expect(screen.getByRole<HTMLButtonElement>('button', { name: 'Sign in' }).type).toBe('submit');
});

it('hands over what was typed, trimmed', async () => {
  const signIn = jest.fn().mockResolvedValue(undefined);
  render(<SignInForm onSignIn={signIn} />);
  fill('  ines@brackwater.example ', ' thirteen runs ');
  submit();
  await waitFor(() => expect(signIn).toHaveBeenCalledTimes(1));
  // a space may be part of a password
  expect(signIn.mock.calls[0][0]).toEqual({ email: 'ines@brackwater.example', password: ' thirteen runs ' });
});

it('says what the server says, keeps the e-mail, empties the password and goes there', async () => {
  const wait = 'Too many tries from your network. Try again in 15 minutes.';
  render(<SignInForm onSignIn={() => Promise.reject(refused(wait, 429))} />);
  fill('ines@brackwater.example', 'wrong');
  submit();
  expect((await screen.findByRole('alert')).textContent).toBe(wait);
  expect(email().value).toBe('ines@brackwater.example');
  expect(password().value).toBe('');
  expect(document.activeElement).toBe(password());
});

it('asks for what is not filled in, without asking the server', async () => {
  const signIn = jest.fn();
  render(<SignInForm email="ines@brackwater.example" onSignIn={signIn} />);
  submit();
  expect((await screen.findByRole('alert')).textContent).toBe('Must be filled in');
  expect(document.activeElement).toBe(password());
  expect(signIn).not.toHaveBeenCalled();
});
