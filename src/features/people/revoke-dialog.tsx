import type { Invitation } from '#shared/contracts/people.ts';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { Dialog } from '../../ui/dialog.tsx';
import { Notice } from '../../ui/notice.tsx';
import { useRevokeInvitation } from './api/revoke-invitation.ts';

interface RevokeDialogProps {
  readonly invitation: Invitation;
  readonly onDone: (words: string) => void;
  readonly onClose: () => void;
}

/** Asks with the address: the link that was mailed ends. */
export function RevokeDialog({ invitation: { id, email }, onDone, onClose }: RevokeDialogProps) {
  const revoke = useRevokeInvitation();
  return (
    <Dialog
      title={`Revoke the invitation of ${email}`}
      onClose={onClose}
      actions={
        <>
          <Button
            kind="main"
            busy={revoke.isPending ? 'Revoking' : ''}
            onClick={() =>
              revoke.mutate(id, { onSuccess: () => onDone(`The link of ${email} opens nothing any more.`) })
            }
          >
            Revoke the invitation
          </Button>
          <Button onClick={onClose}>Keep it</Button>
        </>
      }
    >
      {revoke.isError && (
        <Notice level="stop" word="Not revoked" live>
          {sayError(revoke.error)}
        </Notice>
      )}
      <p>
        The link mailed to <strong className="font-bold wrap-anywhere">{email}</strong> stops at once. You can invite
        the address again.
      </p>
    </Dialog>
  );
}
