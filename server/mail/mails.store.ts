import { randomUUID } from 'node:crypto';
import { and, eq, isNull, lt, lte, or, sql } from 'drizzle-orm';
import type { Database } from '../db/database.ts';
import { mails } from '../db/schema.ts';
import type { OutgoingMail } from './mail-transport.ts';

export type MailsStore = ReturnType<typeof mailsStore>;

/** A mail that this process alone may send until its lease runs out. */
export interface ClaimedMail extends OutgoingMail {
  readonly id: string;
  readonly claim: string;
  /** This one counted. */
  readonly tries: number;
  readonly firstTriedAt: Date;
}

const RELEASED = { claim: null, claimedUntil: null };

/** The queue of mails. Each change after a claim answers false when the claim is no longer the caller's, and then changes nothing. */
export const mailsStore = (database: Database) => {
  const change = async ({ id, claim }: ClaimedMail, set: Partial<typeof mails.$inferInsert>): Promise<boolean> => {
    const rows = await database.queries
      .update(mails)
      .set(set)
      .where(and(eq(mails.id, id), eq(mails.claim, claim)))
      .returning({ id: mails.id });
    return rows.length > 0;
  };

  return {
    /** Claims the mail that waits longest and is due `at`, until `until`. Undefined when none is due. */
    async claim(at: Date, until: Date): Promise<ClaimedMail | undefined> {
      const due = database.queries
        .select({ id: mails.id })
        .from(mails)
        .where(
          and(
            eq(mails.state, 'waiting'),
            or(isNull(mails.dueAt), lte(mails.dueAt, at)),
            or(isNull(mails.claimedUntil), lt(mails.claimedUntil, at)),
          ),
        )
        .orderBy(mails.ordinal)
        .limit(1)
        // Another process that claims at this very moment gets the next one and does not wait for this one.
        .for('update', { skipLocked: true });
      const claim = randomUUID();
      const [row] = await database.queries
        .update(mails)
        .set({
          claim,
          claimedUntil: until,
          tries: sql`${mails.tries} + 1`,
          firstTriedAt: sql`coalesce(${mails.firstTriedAt}, ${at.toISOString()}::timestamptz)`,
        })
        // With "=" the subquery runs once; as a join it could run again and lock more than one row.
        .where(sql`${mails.id} = (${due})`)
        .returning();
      if (!row) return undefined;
      const { id, event, to, subject, text, html, tries, firstTriedAt } = row;
      return { id, claim, event, to, subject, text, html, tries, firstTriedAt: firstTriedAt ?? at };
    },

    renew: (mail: ClaimedMail, until: Date) => change(mail, { claimedUntil: until }),

    /** Links in a mail open doors, so its words do not stay. */
    markSent: (mail: ClaimedMail, sentAt: Date) =>
      change(mail, { ...RELEASED, state: 'sent', sentAt, text: '', html: '', lastError: null }),

    putOff: (mail: ClaimedMail, dueAt: Date, lastError: string) => change(mail, { ...RELEASED, dueAt, lastError }),

    markFailed: (mail: ClaimedMail, lastError: string) => change(mail, { ...RELEASED, state: 'failed', lastError }),

    /** Without a mail server: what waits is there to be read, and is never sent. */
    async keepForReading(): Promise<void> {
      await database.queries
        .update(mails)
        .set({ ...RELEASED, state: 'outbox' })
        .where(eq(mails.state, 'waiting'));
    },
  };
};
