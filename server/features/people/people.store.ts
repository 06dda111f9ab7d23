import { and, asc, eq, sql } from 'drizzle-orm';
import type { Role } from '#shared/contracts/roles.ts';
import type { Database } from '../../db/database.ts';
import { sessions, shops, users } from '../../db/schema.ts';

export interface PersonRow {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly role: Role;
  readonly createdAt: Date;
  readonly lastSignInAt: Date | null;
  readonly disabled: boolean;
  readonly demo: boolean;
}

export interface PersonState {
  readonly role: Role;
  readonly disabled: boolean;
}

export type PeopleStore = ReturnType<typeof peopleStore>;

const columns = {
  id: users.id,
  name: users.name,
  email: users.email,
  role: users.role,
  createdAt: users.createdAt,
  lastSignInAt: users.lastSignInAt,
  disabled: users.disabled,
  demo: sql<boolean>`${shops.demo} and ${users.passwordHash} is null`,
};

/** The people of a shop. */
export const peopleStore = (database: Database) => ({
  async list(shopId: string): Promise<PersonRow[]> {
    return database.queries
      .select(columns)
      .from(users)
      .innerJoin(shops, eq(shops.id, users.shopId))
      .where(eq(users.shopId, shopId))
      .orderBy(asc(users.createdAt), asc(users.id));
  },

  async find(shopId: string, personId: string): Promise<PersonRow | null> {
    const [row] = await database.queries
      .select(columns)
      .from(users)
      .innerJoin(shops, eq(shops.id, users.shopId))
      .where(and(eq(users.shopId, shopId), eq(users.id, personId)));
    return row ?? null;
  },

  /**
   * Changes a person of a shop; without access all their sessions end. False, and nothing is changed, when the shop would
   * be left without an owner: the owners are locked, so that two who demote each other at once do not both succeed.
   */
  async change(shopId: string, personId: string, to: PersonState): Promise<boolean> {
    return database.transaction(async (tx) => {
      const owners = await tx
        .select({ id: users.id })
        .from(users)
        .where(and(eq(users.shopId, shopId), eq(users.role, 'owner'), eq(users.disabled, false)))
        .orderBy(asc(users.id))
        .for('update');
      const staysOwner = to.role === 'owner' && !to.disabled;
      if (!staysOwner && owners.every(({ id }) => id === personId)) return false;
      await tx
        .update(users)
        .set(to)
        .where(and(eq(users.shopId, shopId), eq(users.id, personId)));
      if (to.disabled) await tx.delete(sessions).where(eq(sessions.userId, personId));
      return true;
    });
  },
});
