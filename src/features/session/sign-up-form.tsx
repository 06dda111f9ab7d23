import { useState } from 'react';
import { LIMITS } from '#shared/contracts/limits.ts';
import { signUpRequest, type SignUpRequest } from '#shared/contracts/session.ts';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { Choice } from '../../ui/choice.tsx';
import { Notice } from '../../ui/notice.tsx';
import { TextField } from '../../ui/text-field.tsx';
import { useCheckedForm } from '../../ui/use-checked-form.ts';
import { useSignUp } from './api/sign-up.ts';

const BLANK: SignUpRequest = { shopName: '', name: '', email: '', password: '', unit: 'in' };

/** Opens a shop with its first person, the owner. */
export function SignUpForm() {
  const [entry, setEntry] = useState(BLANK);
  const signUp = useSignUp();
  const set = (key: keyof SignUpRequest) => (value: string) => setEntry((now) => ({ ...now, [key]: value }));

  const { form, wrong, submit } = useCheckedForm(signUpRequest, entry, signUp.mutate);

  return (
    <form ref={form} onSubmit={submit} noValidate>
      {signUp.isError && (
        <Notice level="stop" word="No shop opened" live>
          {sayError(signUp.error)}
        </Notice>
      )}
      <TextField
        label="Name of the shop"
        name="organization"
        autoComplete="organization"
        value={entry.shopName}
        onValue={set('shopName')}
        error={wrong.shopName}
      />
      <TextField
        label="Your name"
        name="name"
        autoComplete="name"
        value={entry.name}
        onValue={set('name')}
        error={wrong.name}
        hint="Stands on setup sheets that you release."
      />
      <TextField
        label="E-mail"
        type="email"
        name="email"
        autoComplete="username"
        value={entry.email}
        onValue={set('email')}
        error={wrong.email}
      />
      <TextField
        label="Password"
        type="password"
        name="password"
        autoComplete="new-password"
        value={entry.password}
        onValue={set('password')}
        error={wrong.password}
        hint={`At least ${LIMITS.passwordShortest} characters; a short sentence is good.`}
      />
      <Choice
        label="New frames are drawn in"
        options={[
          { value: 'in', label: 'Inches' },
          { value: 'mm', label: 'Millimetres' },
        ]}
        value={entry.unit ?? 'in'}
        onValue={set('unit')}
        hint="Each frame keeps its own unit; this is only where new ones begin."
      />
      <div className="mt-4">
        <Button kind="main" type="submit" wide busy={signUp.isPending ? 'Opening the shop' : ''}>
          Open the shop
        </Button>
      </div>
    </form>
  );
}
