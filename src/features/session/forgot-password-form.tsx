import { useState } from 'react';
import { forgotPasswordRequest } from '#shared/contracts/session.ts';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { Notice } from '../../ui/notice.tsx';
import { TextField } from '../../ui/text-field.tsx';
import { useCheckedForm } from '../../ui/use-checked-form.ts';
import { useForgotPassword } from './api/forgot-password.ts';

/** Asks for a link to a new password. What it answers does not tell whether the address has an account. */
export function ForgotPasswordForm() {
  const [email, setEmail] = useState('');
  const forgot = useForgotPassword();

  const { form, wrong, submit } = useCheckedForm(forgotPasswordRequest, { email }, forgot.mutate);

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
