import { useState, type FormEvent } from 'react';
import { LIMITS } from '#shared/contracts/limits.ts';
import { joinRequest } from '#shared/contracts/people.ts';
import type { Session } from '#shared/contracts/session.ts';
import { checkForm } from '../../lib/check-form.ts';
import { fieldMessagesOf, type FieldMessages } from '../../lib/field-messages.ts';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { Notice } from '../../ui/notice.tsx';
import { TextField } from '../../ui/text-field.tsx';
import { useFocusOnWrong } from '../../ui/use-focus-on-wrong.ts';
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
  const [wrong, setWrong] = useState<FieldMessages>({});
  const form = useFocusOnWrong(wrong);
  const join = useJoinShop(onJoined);

  function submit(event: FormEvent) {
    event.preventDefault();
    const checked = checkForm(joinRequest, { token, name, password });
    setWrong(checked.ok ? {} : checked.fields);
    if (!checked.ok) return;
    join.mutate(checked.value, { onError: (error) => setWrong(fieldMessagesOf(error)) });
  }

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
