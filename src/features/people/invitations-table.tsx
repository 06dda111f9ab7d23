import type { Invitation } from '#shared/contracts/people.ts';
import { Button } from '../../ui/button.tsx';
import { Table, type Column } from '../../ui/table.tsx';
import { When } from '../../ui/when.tsx';

interface InvitationsTableProps {
  readonly invitations: readonly Invitation[];
  /** Of the invitation that is being sent anew; '' when none is. */
  readonly sendingId: string;
  readonly onResend: (invitation: Invitation) => void;
  readonly onRevoke: (invitation: Invitation) => void;
}

/** Who was invited and has not come yet. */
export function InvitationsTable({ invitations, sendingId, onResend, onRevoke }: InvitationsTableProps) {
  const columns: readonly Column<Invitation>[] = [
    {
      key: 'email',
      head: 'E-mail',
      names: true,
      cell: ({ email }) => <span className="font-bold wrap-anywhere">{email}</span>,
      sortBy: ({ email }) => email,
    },
    { key: 'role', head: 'Role', cell: ({ role }) => role, sortBy: ({ role }) => role },
    {
      key: 'by',
      head: 'Invited by',
      cell: ({ invitedBy }) => <span className="wrap-anywhere">{invitedBy}</span>,
      spare: true,
    },
    {
      key: 'sent',
      head: 'Sent',
      cell: ({ invitedAt }) => <When iso={invitedAt} />,
      sortBy: ({ invitedAt }) => invitedAt,
    },
    {
      key: 'until',
      head: 'Link works until',
      cell: ({ expiresAt, expired }) =>
        expired ? (
          <span className="text-caution">
            past its time, since <When iso={expiresAt} />
          </span>
        ) : (
          <When iso={expiresAt} />
        ),
      sortBy: ({ expiresAt }) => expiresAt,
    },
    {
      key: 'acts',
      head: 'What to do',
      hideHead: true,
      align: 'right',
      cell: (invitation) => (
        <span className="inline-flex flex-wrap justify-end gap-x-4">
          <Button
            kind="quiet"
            aria-label={`Send anew to ${invitation.email}`}
            busy={invitation.id === sendingId ? 'Sending' : ''}
            onClick={() => onResend(invitation)}
          >
            Send anew
          </Button>
          <Button
            kind="quiet"
            aria-label={`Revoke the invitation of ${invitation.email}`}
            onClick={() => onRevoke(invitation)}
          >
            Revoke
          </Button>
        </span>
      ),
    },
  ];
  return <Table caption="Open invitations" columns={columns} rows={invitations} rowKey={({ id }) => id} />;
}
