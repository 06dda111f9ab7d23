import type { StoredProfile } from '#shared/contracts/profiles.ts';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { Dialog } from '../../ui/dialog.tsx';
import { Notice } from '../../ui/notice.tsx';
import { useDeleteProfile } from './api/delete-profile.ts';

interface DeleteProfileDialogProps {
  readonly stored: StoredProfile;
  readonly onDeleted: () => void;
  readonly onClose: () => void;
}

/** Asks with the profile's name: this cannot be undone. */
export function DeleteProfileDialog({ stored: { id, profile }, onDeleted, onClose }: DeleteProfileDialogProps) {
  const remove = useDeleteProfile();
  return (
    <Dialog
      title={`Delete ${profile.name}`}
      onClose={onClose}
      actions={
        <>
          <Button
            kind="main"
            busy={remove.isPending ? 'Deleting' : ''}
            onClick={() => remove.mutate(id, { onSuccess: onDeleted })}
          >
            {`Delete ${profile.name}`}
          </Button>
          <Button onClick={onClose}>Keep it</Button>
        </>
      }
    >
      {remove.isError && (
        <Notice level="stop" word="Not deleted" live>
          {sayError(remove.error)}
        </Notice>
      )}
      <p>
        Delete the file profile <strong className="font-bold wrap-anywhere">{profile.name}</strong>? It cannot be
        undone. Released revisions stay; they download in another profile.
      </p>
    </Dialog>
  );
}
