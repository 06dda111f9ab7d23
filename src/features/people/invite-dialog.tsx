import { useState, type FormEvent } from 'react';
import { invitationRequest, type Invitation } from '#shared/contracts/people.ts';
import type { Role } from '#shared/contracts/roles.ts';
import { isCode } from '../../lib/api-error.ts';
import { checkForm } from '../../lib/check-form.ts';
import { fieldMessagesOf, type FieldMessages } from '../../lib/field-messages.ts';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { Dialog } from '../../ui/dialog.tsx';
import { Notice } from '../../ui/notice.tsx';
import { Select } from '../../ui/select.tsx';
import { TextField } from '../../ui/text-field.tsx';
import { useFocusOnWrong } from '../../ui/use-focus-on-wrong.ts';
import { useInvitePerson } from './api/invite-person.ts';
import { ROLE_OPTIONS } from './role-words.ts';

interface InviteDialogProps {
  readonly onInvited: (invitation: Invitation) => void;
  readonly onClose: () => void;
}

/** Asks whom to invite, and as what. */
export function InviteDialog({ onInvited, onClose }: InviteDialogProps) {
  const [email, setEmail] = useState('');
  const [role, setRole] = useState<Role>('designer');
  const [wrong, setWrong] = useState<FieldMessages>({});
  const form = useFocusOnWrong(wrong);
  const invite = useInvitePerson();

  function submit(event: FormEvent) {
    event.preventDefault();
    const checked = checkForm(invitationRequest, { email, role });
    setWrong(checked.ok ? {} : checked.fields);
    if (!checked.ok) return;
    invite.mutate(checked.value, {
      onSuccess: onInvited,
      // The code's usual sentence is for somebody who signs up.
      onError: (error) => setWrong(isCode(error, 'email-taken') ? { email: error.message } : fieldMessagesOf(error)),
    });
  }

  return (
    <Dialog title="Invite somebody" onClose={onClose}>
      <form ref={form} onSubmit={submit} noValidate>
        {invite.isError && !isCode(invite.error, 'email-taken') && (
          <Notice level="stop" word="Not invited" live>
            {sayError(invite.error)}
          </Notice>
        )}
        <TextField
          label="E-mail"
          type="email"
          name="email"
          autoComplete="off"
          value={email}
          onValue={setEmail}
          error={wrong.email}
          hint="A link goes to this address. It works once, for seven days."
        />
        <Select
          label="Role"
          layout="stack"
          options={ROLE_OPTIONS}
          value={role}
          onValue={setRole}
          error={wrong.role}
          hint="It can be changed later."
        />
        <div className="mt-4 flex flex-wrap gap-3">
          <Button kind="main" type="submit" busy={invite.isPending ? 'Inviting' : ''}>
            Send the invitation
          </Button>
          <Button onClick={onClose}>Cancel</Button>
        </div>
      </form>
    </Dialog>
  );
}
