import { useState } from 'react';
import { signInRequest } from '#shared/contracts/session.ts';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { Notice } from '../../ui/notice.tsx';
import { TextField } from '../../ui/text-field.tsx';
import { useCheckedForm } from '../../ui/use-checked-form.ts';
import { useSignIn } from './api/sign-in.ts';

interface SignInFormProps {
  /** Filled in already, when the page knows who it was. */
  readonly email?: string;
}

export function SignInForm({ email: knownEmail = '' }: SignInFormProps) {
  const [email, setEmail] = useState(knownEmail);
  const [password, setPassword] = useState('');
  const signIn = useSignIn();

  const { form, wrong, submit } = useCheckedForm(signInRequest, { email, password }, signIn.mutate);

  return (
    <form ref={form} onSubmit={submit} noValidate>
      {signIn.isError && (
        <Notice level="stop" word="Not signed in" live>
          {sayError(signIn.error)}
        </Notice>
      )}
      <TextField
        label="E-mail"
        type="email"
        name="email"
        autoComplete="username"
        value={email}
        onValue={setEmail}
        error={wrong.email}
      />
      <TextField
        label="Password"
        type="password"
        name="password"
        autoComplete="current-password"
        value={password}
        onValue={setPassword}
        error={wrong.password}
      />
      <Button kind="main" type="submit" wide busy={signIn.isPending ? 'Signing in' : ''}>
        Sign in
      </Button>
    </form>
  );
}
