import { useState } from 'react';
import { MOST_MAILS, type OutboxList, type OutboxMail } from '#shared/contracts/outbox.ts';
import { Empty } from '../../ui/empty.tsx';
import { Notice } from '../../ui/notice.tsx';
import { plural } from '../../ui/plural.ts';
import { Sheet } from '../../ui/sheet.tsx';
import { Table, type Column } from '../../ui/table.tsx';
import { TitleBlock, TitleCell } from '../../ui/title-block.tsx';
import { When } from '../../ui/when.tsx';
import { MailDialog } from './mail-dialog.tsx';
import { MailState } from './mail-state.tsx';

const columns = (onOpen: (mail: OutboxMail) => void): readonly Column<OutboxMail>[] => [
  {
    key: 'subject',
    head: 'Mail',
    names: true,
    cell: (mail) => (
      <button
        type="button"
        onClick={() => onOpen(mail)}
        className="min-h-6 text-left font-bold underline decoration-rule underline-offset-4 wrap-anywhere hover:decoration-ink"
      >
        {mail.subject}
      </button>
    ),
    sortBy: ({ subject }) => subject,
  },
  { key: 'to', head: 'To', cell: ({ to }) => <span className="wrap-anywhere">{to}</span>, sortBy: ({ to }) => to },
  {
    key: 'written',
    head: 'Written',
    cell: ({ queuedAt }) => <When iso={queuedAt} />,
    sortBy: ({ queuedAt }) => queuedAt,
  },
  { key: 'state', head: 'What became of it', cell: (mail) => <MailState mail={mail} /> },
];

/** Mails that the product wrote for the shop, to read, or to see what became of them. */
export function OutboxPage({ outbox, shopName }: { readonly outbox: OutboxList; readonly shopName: string }) {
  const { mails, sending } = outbox;
  const [open, setOpen] = useState<string | null>(null);
  const opened = mails.find(({ id }) => id === open);
  const failed = mails.filter(({ state }) => state === 'failed').length;
  return (
    <Sheet
      title="Outbox"
      titleBlock={
        <TitleBlock actionNote={sending ? 'a mail server carries them' : 'no mail server: hand them on yourself'}>
          <TitleCell label="Shop">{shopName}</TitleCell>
          <TitleCell label="Page" main>
            Outbox
          </TitleCell>
          <TitleCell label="In it">
            {mails.length < MOST_MAILS ? plural(mails.length, 'mail') : `the newest ${MOST_MAILS} mails`}
          </TitleCell>
          <TitleCell label="Not sent">{failed === 0 ? 'none' : plural(failed, 'mail')}</TitleCell>
        </TitleBlock>
      }
    >
      {!sending && (
        <Notice level="note">
          This server sends no mails. Open one and give its link to whoever it is for, or have the server set up with a
          mail server.
        </Notice>
      )}
      {mails.length === 0 ? (
        <Empty title="Nothing was mailed yet">Invitations and links for new passwords will be here.</Empty>
      ) : (
        <Table
          caption="Mails of the shop"
          columns={columns(({ id }) => setOpen(id))}
          rows={mails}
          rowKey={({ id }) => id}
        />
      )}
      {opened && <MailDialog mail={opened} onClose={() => setOpen(null)} />}
    </Sheet>
  );
}
