import { useState, type FormEvent, type ReactNode } from 'react';
import { LIMITS } from '#shared/contracts/limits.ts';
import { fieldMessagesOf } from '../../lib/field-messages.ts';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { Dialog } from '../../ui/dialog.tsx';
import { Notice } from '../../ui/notice.tsx';
import { TextField } from '../../ui/text-field.tsx';

interface NameDialogProps {
  readonly title: string;
  /** What the button says, idle and busy. */
  readonly action: string;
  readonly working: string;
  readonly name?: string;
  readonly hint?: string;
  readonly busy: boolean;
  /** Of the last try; null when there was none. */
  readonly error: Error | null;
  readonly onName: (name: string) => void;
  readonly onClose: () => void;
  /** More entries, under the name. */
  readonly children?: ReactNode;
}

/** Asks for the name of something new, or for another one. */
export function NameDialog(props: NameDialogProps) {
  const { title, action, working, name: given = '', hint, busy, error, onName, onClose, children } = props;
  const [name, setName] = useState(given);
  const [empty, setEmpty] = useState(false);
  const fields = fieldMessagesOf(error);
  const wrong =
    empty && name.trim() === '' ? 'Got nothing; takes a name.' : (fields.name ?? fields['particulars.name']);

  function submit(event: FormEvent) {
    event.preventDefault();
    setEmpty(name.trim() === '');
    if (name.trim() !== '' && !busy) onName(name.trim());
  }

  return (
    <Dialog title={title} onClose={onClose}>
      <form onSubmit={submit} noValidate>
        {error !== null && wrong === undefined && (
          <Notice level="stop" word="Not done" live>
            {sayError(error)}
          </Notice>
        )}
        <TextField
          label="Name"
          value={name}
          onValue={setName}
          error={wrong}
          hint={hint}
          maxLength={LIMITS.nameLength}
          autoComplete="off"
        />
        {children}
        <div className="mt-4 flex gap-3">
          <Button kind="main" type="submit" busy={busy ? working : ''}>
            {action}
          </Button>
          <Button onClick={onClose}>Cancel</Button>
        </div>
      </form>
    </Dialog>
  );
}
