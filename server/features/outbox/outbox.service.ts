import { MOST_MAILS, type OpenedMail, type OutboxList, type OutboxMail } from '#shared/contracts/outbox.ts';
import { notFound } from '../../errors.ts';
import type { MailRow, OutboxStore } from './outbox.store.ts';

export type OutboxService = ReturnType<typeof outboxService>;

const present = ({ id, to, subject, state, tries, lastError, queuedAt, sentAt, dueAt }: MailRow): OutboxMail => ({
  id,
  to,
  subject,
  state,
  tries,
  lastError,
  queuedAt: queuedAt.toISOString(),
  sentAt: sentAt?.toISOString() ?? null,
  dueAt: state === 'waiting' ? (dueAt?.toISOString() ?? null) : null,
});

/** Mails of a shop, for its owner. `sending`: there is a mail server, which mails go to. */
export const outboxService = (store: OutboxStore, sending: boolean) => {
  // Without a mail server a mail is there to be read at once, and not only when the mailer has come round.
  const settle = <Row extends MailRow>(row: Row): Row =>
    row.state === 'waiting' && !sending ? { ...row, state: 'outbox' } : row;
  return {
    async list(shopId: string): Promise<OutboxList> {
      return { sending, mails: (await store.list(shopId, MOST_MAILS)).map((row) => present(settle(row))) };
    },

    /** Throws 'not-found'. */
    async open(shopId: string, id: string): Promise<OpenedMail> {
      const found = await store.find(shopId, id);
      if (!found) throw notFound('mail');
      const row = settle(found);
      return { ...present(row), text: row.state === 'outbox' ? row.text : null };
    },
  };
};
