import { and, count, eq, gt, isNull, lte } from 'drizzle-orm';
import type { Database } from '../../db/database.ts';
import { passwordResets, sessions, users } from '../../db/schema.ts';
import { queueMail } from '../../mail/queue-mail.ts';

type Mail = Parameters<typeof queueMail>[1];

export type ResetsStore = ReturnType<typeof resetsStore>;

/** Links to a new password. */
export const resetsStore = (database: Database) => ({
  /** Who may set a new password by mail: people with a password and access. */
  async findForgetful(email: string): Promise<{ id: string; shopId: string; name: string; email: string } | null> {
    const [row] = await database.queries
      .select({ id: users.id, shopId: users.shopId, name: users.name, email: users.email, hash: users.passwordHash })
      .from(users)
      .where(and(eq(users.email, email), eq(users.disabled, false)));
    if (!row || row.hash === null) return null;
    const { hash: _, ...person } = row;
    return person;
  },

  /** How many links of this person still work. */
  async countOpen(userId: string, now: Date): Promise<number> {
    const open = and(
      eq(passwordResets.userId, userId),
      isNull(passwordResets.usedAt),
      gt(passwordResets.expiresAt, now),
    );
    const [row] = await database.queries.select({ open: count() }).from(passwordResets).where(open);
    return row!.open;
  },

  /** The link and its mail, both or none. Links of this person that are past their time go. */
  async add(reset: { tokenHash: string; userId: string; expiresAt: Date }, mail: Mail, now: Date): Promise<void> {
    const gone = and(eq(passwordResets.userId, reset.userId), lte(passwordResets.expiresAt, now));
    await database.transaction(async (tx) => {
      await tx.delete(passwordResets).where(gone);
      await tx.insert(passwordResets).values(reset);
      await queueMail(tx, mail);
    });
  },

  async isOpen(tokenHash: string, now: Date): Promise<boolean> {
    const [row] = await database.queries
      .select({ userId: users.id })
      .from(passwordResets)
      .innerJoin(users, eq(users.id, passwordResets.userId))
      .where(and(openReset(tokenHash, now), eq(users.disabled, false)));
    return row !== undefined;
  },

  /** Sets the password by a link, ends all sessions of the person and all their links. False when the link does not work, or no more. */
  async use(tokenHash: string, passwordHash: string, now: Date): Promise<boolean> {
    return database.transaction(async (tx) => {
      const [used] = await tx
        .update(passwordResets)
        .set({ usedAt: now })
        .where(openReset(tokenHash, now))
        .returning({ userId: passwordResets.userId });
      if (!used) return false;
      const changed = await tx
        .update(users)
        .set({ passwordHash })
        .where(and(eq(users.id, used.userId), eq(users.disabled, false)))
        .returning({ id: users.id });
      if (changed.length === 0) return false;
      await tx
        .update(passwordResets)
        .set({ usedAt: now })
        .where(and(eq(passwordResets.userId, used.userId), isNull(passwordResets.usedAt)));
      await tx.delete(sessions).where(eq(sessions.userId, used.userId));
      return true;
    });
  },
});

const openReset = (tokenHash: string, now: Date) =>
  and(eq(passwordResets.tokenHash, tokenHash), isNull(passwordResets.usedAt), gt(passwordResets.expiresAt, now));
