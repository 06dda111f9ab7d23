import { useState, type FormEvent } from 'react';
import { forgotPasswordRequest } from '#shared/contracts/session.ts';
import { checkForm } from '../../lib/check-form.ts';
import { fieldMessagesOf, type FieldMessages } from '../../lib/field-messages.ts';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { Notice } from '../../ui/notice.tsx';
import { TextField } from '../../ui/text-field.tsx';
import { useFocusOnWrong } from '../../ui/use-focus-on-wrong.ts';
import { useForgotPassword } from './api/forgot-password.ts';

/** Asks for a link to a new password. What it answers does not tell whether the address has an account. */
export function ForgotPasswordForm() {
  const [email, setEmail] = useState('');
  const [wrong, setWrong] = useState<FieldMessages>({});
  const form = useFocusOnWrong(wrong);
  const forgot = useForgotPassword();

  function submit(event: FormEvent) {
    event.preventDefault();
    const checked = checkForm(forgotPasswordRequest, { email });
    setWrong(checked.ok ? {} : checked.fields);
    if (!checked.ok) return;
    forgot.mutate(checked.value, { onError: (error) => setWrong(fieldMessagesOf(error)) });
  }

  return (
    <form ref={form} onSubmit={submit} noValidate>
      {forgot.isError && (
        <Notice level="stop" word="No link sent" live>
          {sayError(forgot.error)}
        </Notice>
      )}
      {forgot.isSuccess && (
        <Notice level="note" word="Asked for" live>
          If {forgot.variables.email} has an account, a link is on its way to it. It works once, for an hour.
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
      <Button kind="main" type="submit" wide busy={forgot.isPending ? 'Asking' : ''}>
        Mail me a link
      </Button>
    </form>
  );
}
