import { useState, type ReactNode } from 'react';
import { Link } from 'react-router';
import type { Invitation, People, Person } from '#shared/contracts/people.ts';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { Empty } from '../../ui/empty.tsx';
import { Notice } from '../../ui/notice.tsx';
import { Section } from '../../ui/section.tsx';
import { Sheet } from '../../ui/sheet.tsx';
import { TitleBlock, TitleCell } from '../../ui/title-block.tsx';
import { useChangePerson } from './api/change-person.ts';
import { useResendInvitation } from './api/resend-invitation.ts';
import { InvitationsTable } from './invitations-table.tsx';
import { InviteDialog } from './invite-dialog.tsx';
import { PeopleTable } from './people-table.tsx';
import { RevokeDialog } from './revoke-dialog.tsx';
import { RoleDialog } from './role-dialog.tsx';
import { TakeAccessDialog } from './take-access-dialog.tsx';

interface PeoplePageProps extends People {
  readonly shopName: string;
  readonly myId: string;
}

type Open =
  | { readonly dialog: 'invite' }
  | { readonly dialog: 'role' | 'take'; readonly person: Person }
  | { readonly dialog: 'revoke'; readonly invitation: Invitation };

/** Where a mail is found that did not go out. */
const IN_THE_OUTBOX = (
  <>
    {' '}
    A server that sends no mail keeps it in the{' '}
    <Link to="/outbox" className="underline underline-offset-4">
      outbox
    </Link>
    .
  </>
);

/** People of the shop and open invitations, for the owner. */
export function PeoplePage({ people, invitations, shopName, myId }: PeoplePageProps) {
  const [open, setOpen] = useState<Open | null>(null);
  /** What was done last. */
  const [done, setDone] = useState<ReactNode>(null);
  const change = useChangePerson();
  const resend = useResendInvitation();
  const failed = change.error ?? resend.error;
  const inside = people.filter(({ disabled }) => !disabled).length;

  const close = () => setOpen(null);
  const finish = (words: ReactNode) => {
    close();
    setDone(words);
  };
  const sent = ({ email }: Invitation) =>
    finish(
      <>
        A link for {email} is queued as a mail.{IN_THE_OUTBOX}
      </>,
    );
  const giveBack = ({ id, name }: Person) =>
    change.mutate({ id, change: { disabled: false } }, { onSuccess: () => finish(`${name} can sign in again.`) });
  const invite = () => setOpen({ dialog: 'invite' });

  return (
    <Sheet
      title="People"
      titleBlock={
        <TitleBlock
          action={
            <Button kind="main" wide onClick={invite}>
              Invite somebody
            </Button>
          }
        >
          <TitleCell label="Shop" main>
            {shopName}
          </TitleCell>
          <TitleCell label="Page">People</TitleCell>
          <TitleCell label="With access">{inside}</TitleCell>
          <TitleCell label="Invited">{invitations.length}</TitleCell>
        </TitleBlock>
      }
    >
      {failed !== null && (
        <Notice level="stop" word="Not done" live>
          {sayError(failed)}
        </Notice>
      )}
      {failed === null && done !== null && (
        <Notice level="note" word="Done" live>
          {done}
        </Notice>
      )}
      <Section heading="In the shop">
        <PeopleTable
          people={people}
          myId={myId}
          onRole={(person) => setOpen({ dialog: 'role', person })}
          onTake={(person) => setOpen({ dialog: 'take', person })}
          onGiveBack={giveBack}
        />
      </Section>
      <Section heading="Invited">
        {invitations.length === 0 ? (
          <Empty title="Nobody is invited" actions={<Button onClick={invite}>Invite somebody to the shop</Button>}>
            Those who draw, program and cut get a link by mail and choose a password of their own.
          </Empty>
        ) : (
          <InvitationsTable
            invitations={invitations}
            sendingId={resend.isPending ? resend.variables : ''}
            onResend={({ id }) => resend.mutate(id, { onSuccess: sent })}
            onRevoke={(invitation) => setOpen({ dialog: 'revoke', invitation })}
          />
        )}
      </Section>
      {open?.dialog === 'invite' && <InviteDialog onInvited={sent} onClose={close} />}
      {open?.dialog === 'role' && <RoleDialog person={open.person} onDone={finish} onClose={close} />}
      {open?.dialog === 'take' && <TakeAccessDialog person={open.person} onDone={finish} onClose={close} />}
      {open?.dialog === 'revoke' && <RevokeDialog invitation={open.invitation} onDone={finish} onClose={close} />}
    </Sheet>
  );
}
