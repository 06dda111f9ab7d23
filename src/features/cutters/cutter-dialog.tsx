import { useId, useState } from 'react';
import type { CutterChanged, StoredCutter } from '#shared/contracts/cutters.ts';
import type { DrawerEntry } from '#shared/kernel/cutter-drawer/drawer-cutter.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { fieldMessagesOf, type FieldMessages } from '../../lib/field-messages.ts';
import { sayError } from '../../lib/say-error.ts';
import { AskUnsaved } from '../../ui/ask-unsaved.tsx';
import { Button } from '../../ui/button.tsx';
import { Dialog } from '../../ui/dialog.tsx';
import { LeaveUnsavedDialog } from '../../ui/leave-unsaved-dialog.tsx';
import { Notice } from '../../ui/notice.tsx';
import { useFocusOnWrong } from '../../ui/use-focus-on-wrong.ts';
import { useChangeCutter } from './api/change-cutter.ts';
import { useCreateCutter } from './api/create-cutter.ts';
import { CutterForm } from './cutter-form.tsx';
import { newTexts, readTexts, sameTexts, textsOf } from './entry-texts.ts';

interface CutterDialogProps {
  /** Null for a new one. */
  readonly stored: StoredCutter | null;
  /** Of the shop, for a new one. */
  readonly unit: Unit;
  readonly onChanged: (before: StoredCutter, answer: CutterChanged) => void;
  readonly onClose: () => void;
}

/** A new cutter, or one of the drawer to change. */
export function CutterDialog({ stored, unit, onChanged, onClose }: CutterDialogProps) {
  const id = useId();
  const [opened] = useState(() => (stored ? textsOf(stored) : newTexts(unit)));
  const [texts, setTexts] = useState(opened);
  const [asking, setAsking] = useState(false);
  const [wrong, setWrong] = useState<FieldMessages>({});
  const create = useCreateCutter();
  const change = useChangeCutter();
  const form = useFocusOnWrong(wrong);
  const failed = create.error ?? change.error;
  const name = stored?.cutter.name ?? 'The new cutter';
  const unsaved = !sameTexts(texts, opened);
  const close = () => (unsaved ? setAsking(true) : onClose());
  const onError = (error: unknown) => setWrong(fieldMessagesOf(error));

  function save() {
    const read = readTexts(texts);
    setWrong(read.ok ? {} : read.fields);
    if (read.ok) send(read.value);
  }

  function send(entry: DrawerEntry) {
    if (stored === null) return create.mutate(entry, { onSuccess: onClose, onError });
    change.mutate(
      { cutterId: stored.id, entry },
      {
        onSuccess: (answer) => {
          onChanged(stored, answer);
          onClose();
        },
        onError,
      },
    );
  }

  return (
    <>
      <Dialog
        title={stored ? stored.cutter.name : 'New cutter'}
        onClose={close}
        actions={
          <>
            <Button kind="main" type="submit" form={id} busy={create.isPending || change.isPending ? 'Saving' : ''}>
              {stored ? 'Save the cutter' : 'Put it in the drawer'}
            </Button>
            <Button onClick={close}>Cancel</Button>
          </>
        }
      >
        {failed && (
          <Notice level="stop" word="Not saved" live>
            {sayError(failed)}
          </Notice>
        )}
        <form
          id={id}
          ref={form}
          noValidate
          onSubmit={(event) => {
            event.preventDefault();
            save();
          }}
        >
          <CutterForm texts={texts} onTexts={setTexts} wrong={wrong} />
        </form>
      </Dialog>
      {asking && <AskUnsaved name={name} onStay={() => setAsking(false)} onLeave={onClose} />}
      <LeaveUnsavedDialog name={name} unsaved={unsaved} />
    </>
  );
}
