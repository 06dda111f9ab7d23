import { useState } from 'react';
import { Link } from 'react-router';
import { LIMITS } from '#shared/contracts/limits.ts';
import { resetPasswordRequest } from '#shared/contracts/session.ts';
import { isCode } from '../../lib/api-error.ts';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { ButtonLink } from '../../ui/button-link.tsx';
import { Notice } from '../../ui/notice.tsx';
import { TextField } from '../../ui/text-field.tsx';
import { useCheckedForm } from '../../ui/use-checked-form.ts';
import { useResetPassword } from './api/reset-password.ts';

/** A new password, by a mailed link. */
export function ResetPasswordForm({ token }: { readonly token: string }) {
  const [password, setPassword] = useState('');
  const reset = useResetPassword();

  const { form, wrong, submit } = useCheckedForm(resetPasswordRequest, { token, password }, reset.mutate);

  if (reset.isSuccess) {
    return (
      <Notice level="note" word="Done" live action={<ButtonLink to="/sign-in">Sign in</ButtonLink>}>
        The new password holds, and you are signed out everywhere.
      </Notice>
    );
  }
  return (
    <form ref={form} onSubmit={submit} noValidate>
      {reset.isError && (
        <Notice level="stop" word="Not set" live>
          {isCode(reset.error, 'not-found') ? (
            <>
              This link was used or is past its time.{' '}
              <Link to="/forgot-password" className="underline underline-offset-4">
                Ask for another one
              </Link>
            </>
          ) : (
            sayError(reset.error)
          )}
        </Notice>
      )}
      <TextField
        label="New password"
        type="password"
        name="password"
        autoComplete="new-password"
        value={password}
        onValue={setPassword}
        error={wrong.password}
        hint={`At least ${LIMITS.passwordShortest} characters; a short sentence is good.`}
      />
      <Button kind="main" type="submit" wide busy={reset.isPending ? 'Setting it' : ''}>
        Set the password
      </Button>
    </form>
  );
}
