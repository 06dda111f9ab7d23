import { and, desc, eq } from 'drizzle-orm';
import type { Database } from '../../db/database.ts';
import { mails } from '../../db/schema.ts';

export type OutboxStore = ReturnType<typeof outboxStore>;
export type MailRow = Awaited<ReturnType<OutboxStore['list']>>[number];

const LISTED = {
  id: mails.id,
  to: mails.to,
  subject: mails.subject,
  state: mails.state,
  tries: mails.tries,
  lastError: mails.lastError,
  queuedAt: mails.queuedAt,
  sentAt: mails.sentAt,
  dueAt: mails.dueAt,
};

/** A shop's mails, to read. */
export const outboxStore = (database: Database) => ({
  /** The newest, so many at most. */
  list: (shopId: string, most: number) =>
    database.queries
      .select(LISTED)
      .from(mails)
      .where(eq(mails.shopId, shopId))
      .orderBy(desc(mails.ordinal))
      .limit(most),

  /** Undefined when the shop has no such mail. */
  async find(shopId: string, id: string) {
    const [row] = await database.queries
      .select({ ...LISTED, text: mails.text })
      .from(mails)
      .where(and(eq(mails.shopId, shopId), eq(mails.id, id)));
    return row;
  },
});
