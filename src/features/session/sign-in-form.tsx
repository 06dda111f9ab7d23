import { useState, type FormEvent } from 'react';
import { signInRequest } from '#shared/contracts/session.ts';
import { checkForm } from '../../lib/check-form.ts';
import { fieldMessagesOf, type FieldMessages } from '../../lib/field-messages.ts';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { Notice } from '../../ui/notice.tsx';
import { TextField } from '../../ui/text-field.tsx';
import { useFocusOnWrong } from '../../ui/use-focus-on-wrong.ts';
import { useSignIn } from './api/sign-in.ts';

interface SignInFormProps {
  /** Filled in already, when the page knows who it was. */
  readonly email?: string;
}

export function SignInForm({ email: knownEmail = '' }: SignInFormProps) {
  const [email, setEmail] = useState(knownEmail);
  const [password, setPassword] = useState('');
  const [wrong, setWrong] = useState<FieldMessages>({});
  const form = useFocusOnWrong(wrong);
  const signIn = useSignIn();

  function submit(event: FormEvent) {
    event.preventDefault();
    const checked = checkForm(signInRequest, { email, password });
    setWrong(checked.ok ? {} : checked.fields);
    if (!checked.ok) return;
    signIn.mutate(checked.value, { onError: (error) => setWrong(fieldMessagesOf(error)) });
  }

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
