import type { Person } from '#shared/contracts/people.ts';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { Dialog } from '../../ui/dialog.tsx';
import { Notice } from '../../ui/notice.tsx';
import { useChangePerson } from './api/change-person.ts';

interface TakeAccessDialogProps {
  readonly person: Person;
  readonly onDone: (words: string) => void;
  readonly onClose: () => void;
}

/** Asks with the person's name: they are put out at once. */
export function TakeAccessDialog({ person: { id, name }, onDone, onClose }: TakeAccessDialogProps) {
  const change = useChangePerson();
  const take = () =>
    change.mutate({ id, change: { disabled: true } }, { onSuccess: () => onDone(`${name} has no access any more.`) });
  return (
    <Dialog
      title={`Take away the access of ${name}`}
      onClose={onClose}
      actions={
        <>
          <Button kind="main" busy={change.isPending ? 'Taking it away' : ''} onClick={take}>
            Take away access
          </Button>
          <Button onClick={onClose}>Keep it</Button>
        </>
      }
    >
      {change.isError && (
        <Notice level="stop" word="Not changed" live>
          {sayError(change.error)}
        </Notice>
      )}
      <p>
        <strong className="font-bold wrap-anywhere">{name}</strong> is signed out everywhere at once and cannot sign in.
        What they made stays. You can give the access back.
      </p>
    </Dialog>
  );
}
