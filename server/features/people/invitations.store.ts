import { and, asc, eq, gt, isNull } from 'drizzle-orm';
import type { Role } from '#shared/contracts/roles.ts';
import type { Database } from '../../db/database.ts';
import { invitations, shops, users } from '../../db/schema.ts';
import type { SignedIn } from '../../http/signed-in.ts';
import { queueMail } from '../../mail/queue-mail.ts';

type Mail = Parameters<typeof queueMail>[1];

export interface InvitationRow {
  readonly id: string;
  readonly shopId: string;
  readonly email: string;
  readonly role: Role;
  readonly tokenHash: string;
  readonly invitedBy: string;
  readonly invitedAt: Date;
  readonly expiresAt: Date;
}

export type InvitationsStore = ReturnType<typeof invitationsStore>;

const open = and(isNull(invitations.usedAt), isNull(invitations.revokedAt));

/** Doors into a shop that stand open. */
export const invitationsStore = (database: Database) => ({
  list: (shopId: string): Promise<InvitationRow[]> =>
    database.queries
      .select()
      .from(invitations)
      .where(and(eq(invitations.shopId, shopId), open))
      .orderBy(asc(invitations.invitedAt), asc(invitations.id)),

  async find(shopId: string, id: string): Promise<InvitationRow | null> {
    const [row] = await database.queries
      .select()
      .from(invitations)
      .where(and(eq(invitations.shopId, shopId), eq(invitations.id, id), open));
    return row ?? null;
  },

  async shopName(shopId: string): Promise<string> {
    const [row] = await database.queries.select({ name: shops.name }).from(shops).where(eq(shops.id, shopId));
    if (!row) throw new Error(`no shop ${shopId}`);
    return row.name;
  },

  async hasAccount(email: string): Promise<boolean> {
    return (await database.queries.$count(users, eq(users.email, email))) > 0;
  },

  /** An invitation and its mail, both or none, in the place of an open one of the same address. Two at once are a unique violation. */
  async add(row: InvitationRow, mail: Mail): Promise<void> {
    await database.transaction(async (tx) => {
      await tx
        .update(invitations)
        .set({ revokedAt: row.invitedAt })
        .where(and(eq(invitations.shopId, row.shopId), eq(invitations.email, row.email), open));
      await tx.insert(invitations).values(row);
      await queueMail(tx, mail);
    });
  },

  /** A new link and time for an open invitation, and its mail. False when it is not open any more. */
  async renew(row: InvitationRow, mail: Mail): Promise<boolean> {
    const { tokenHash, invitedBy, invitedAt, expiresAt } = row;
    return database.transaction(async (tx) => {
      const renewed = await tx
        .update(invitations)
        .set({ tokenHash, invitedBy, invitedAt, expiresAt })
        .where(and(eq(invitations.shopId, row.shopId), eq(invitations.id, row.id), open))
        .returning({ id: invitations.id });
      if (renewed.length === 0) return false;
      await queueMail(tx, mail);
      return true;
    });
  },

  /** False when there was nothing open to revoke. */
  async revoke(shopId: string, id: string, now: Date): Promise<boolean> {
    const revoked = await database.queries
      .update(invitations)
      .set({ revokedAt: now })
      .where(and(eq(invitations.shopId, shopId), eq(invitations.id, id), open))
      .returning({ id: invitations.id });
    return revoked.length > 0;
  },

  /** What a link leads into; null when it is unknown, used, revoked or past its time. */
  async findOffer(tokenHash: string, now: Date): Promise<{ shopName: string; role: Role; email: string } | null> {
    const [row] = await database.queries
      .select({ shopName: shops.name, role: invitations.role, email: invitations.email })
      .from(invitations)
      .innerJoin(shops, eq(shops.id, invitations.shopId))
      .where(and(eq(invitations.tokenHash, tokenHash), open, gt(invitations.expiresAt, now)));
    return row ?? null;
  },

  /** Uses a link up and takes the person in, both or none. Null when the link does not work. A taken address is a unique violation. */
  async join(
    tokenHash: string,
    newcomer: { readonly id: string; readonly name: string; readonly passwordHash: string },
    now: Date,
  ): Promise<SignedIn | null> {
    return database.transaction(async (tx) => {
      const [used] = await tx
        .update(invitations)
        .set({ usedAt: now })
        .where(and(eq(invitations.tokenHash, tokenHash), open, gt(invitations.expiresAt, now)))
        .returning({ shopId: invitations.shopId, email: invitations.email, role: invitations.role });
      if (!used) return null;
      await tx.insert(users).values({ ...newcomer, ...used, createdAt: now });
      return { id: newcomer.id, name: newcomer.name, ...used };
    });
  },
});
