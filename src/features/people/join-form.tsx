import { useState } from 'react';
import { LIMITS } from '#shared/contracts/limits.ts';
import { joinRequest } from '#shared/contracts/people.ts';
import type { Session } from '#shared/contracts/session.ts';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { Notice } from '../../ui/notice.tsx';
import { TextField } from '../../ui/text-field.tsx';
import { useCheckedForm } from '../../ui/use-checked-form.ts';
import { useJoinShop } from './api/join-shop.ts';

interface JoinFormProps {
  readonly token: string;
  /** As invited; it becomes the one to sign in with. */
  readonly email: string;
  readonly onJoined: (entered: Session) => void;
}

/** Name and password of somebody who was invited. */
export function JoinForm({ token, email, onJoined }: JoinFormProps) {
  const [name, setName] = useState('');
  const [password, setPassword] = useState('');
  const join = useJoinShop(onJoined);

  const { form, wrong, submit } = useCheckedForm(joinRequest, { token, name, password }, join.mutate);

  return (
    <form ref={form} onSubmit={submit} noValidate>
      {join.isError && (
        <Notice level="stop" word="Not joined" live>
          {sayError(join.error)}
        </Notice>
      )}
      <TextField
        label="E-mail"
        type="email"
        name="email"
        autoComplete="username"
        value={email}
        onValue={() => undefined}
        readOnly
        hint="You sign in with it."
      />
      <TextField
        label="Your name"
        name="name"
        autoComplete="name"
        value={name}
        onValue={setName}
        error={wrong.name}
        hint="Stands on setup sheets that you release."
      />
      <TextField
        label="Password"
        type="password"
        name="password"
        autoComplete="new-password"
        value={password}
        onValue={setPassword}
        error={wrong.password}
        hint={`At least ${LIMITS.passwordShortest} characters; a short sentence is good.`}
      />
      <Button kind="main" type="submit" wide busy={join.isPending ? 'Joining' : ''}>
        Join the shop
      </Button>
    </form>
  );
}
