import { useState, type FormEvent } from 'react';
import type { Person } from '#shared/contracts/people.ts';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { Dialog } from '../../ui/dialog.tsx';
import { Notice } from '../../ui/notice.tsx';
import { Select } from '../../ui/select.tsx';
import { useChangePerson } from './api/change-person.ts';
import { ROLE_OPTIONS } from './role-words.ts';

interface RoleDialogProps {
  readonly person: Person;
  readonly onDone: (words: string) => void;
  readonly onClose: () => void;
}

/** Another role for a person. */
export function RoleDialog({ person: { id, name, role: now }, onDone, onClose }: RoleDialogProps) {
  const [role, setRole] = useState(now);
  const change = useChangePerson();
  function submit(event: FormEvent) {
    event.preventDefault();
    if (role === now) return onClose();
    change.mutate({ id, change: { role } }, { onSuccess: () => onDone(`${name} is ${role} now.`) });
  }
  return (
    <Dialog title={`Role of ${name}`} onClose={onClose}>
      <form onSubmit={submit}>
        {change.isError && (
          <Notice level="stop" word="Not changed" live>
            {sayError(change.error)}
          </Notice>
        )}
        <Select
          label="Role"
          layout="stack"
          options={ROLE_OPTIONS}
          value={role}
          onValue={setRole}
          hint="It holds from the next page that they open."
        />
        <div className="mt-4 flex flex-wrap gap-3">
          <Button kind="main" type="submit" busy={change.isPending ? 'Changing' : ''}>
            Change the role
          </Button>
          <Button onClick={onClose}>Cancel</Button>
        </div>
      </form>
    </Dialog>
  );
}
