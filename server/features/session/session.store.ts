import { and, eq, isNull } from 'drizzle-orm';
import type { Shop } from '#shared/contracts/session.ts';
import type { Role } from '#shared/contracts/roles.ts';
import type { DrawerCutter } from '#shared/kernel/cutter-drawer/drawer-cutter.ts';
import type { Database } from '../../db/database.ts';
import { cutters, sessions, shops, users } from '../../db/schema.ts';
import type { SignedIn } from '../../http/signed-in.ts';

const person = { id: users.id, shopId: users.shopId, name: users.name, email: users.email, role: users.role };

export interface NewPerson extends SignedIn {
  readonly passwordHash: string | null;
  readonly createdAt: Date;
}

export interface NewShop extends Shop {
  readonly demo: boolean;
  readonly createdAt: Date;
}

export type SessionStore = ReturnType<typeof sessionStore>;

/** People, their shops and their sessions. */
export const sessionStore = (database: Database) => ({
  /** Null too for people whose access was taken away. */
  async findPerson(id: string): Promise<SignedIn | null> {
    const [row] = await database.queries
      .select(person)
      .from(users)
      .where(and(eq(users.id, id), eq(users.disabled, false)));
    return row ?? null;
  },

  /** Null too for people whose access was taken away. */
  async findByEmail(email: string): Promise<{ person: SignedIn; passwordHash: string | null } | null> {
    const [row] = await database.queries
      .select({ person, passwordHash: users.passwordHash })
      .from(users)
      .where(and(eq(users.email, email), eq(users.disabled, false)));
    return row ?? null;
  },

  /** The shop that is open to anybody without a password; null where there is none. */
  async findDemoPerson(role: Role): Promise<SignedIn | null> {
    const [row] = await database.queries
      .select(person)
      .from(users)
      .innerJoin(shops, eq(shops.id, users.shopId))
      // Whoever was invited into the demo shop has a password, and nobody else enters as them.
      .where(and(eq(shops.demo, true), eq(users.role, role), isNull(users.passwordHash)));
    return row ?? null;
  },

  async demoExists(): Promise<boolean> {
    const rows = await database.queries.select({ id: shops.id }).from(shops).where(eq(shops.demo, true)).limit(1);
    return rows.length > 0;
  },

  async shopOf(shopId: string): Promise<Shop> {
    const [row] = await database.queries
      .select({
        id: shops.id,
        name: shops.name,
        unit: shops.unit,
        paper: shops.paper,
        defaultProfileId: shops.defaultProfileId,
      })
      .from(shops)
      .where(eq(shops.id, shopId));
    if (!row) throw new Error(`a person belongs to shop ${shopId}, which does not exist`);
    return row;
  },

  /** A shop, its first people and what lies in its cutter drawer, all or nothing. A taken e-mail address is a unique violation. */
  async openShop(shop: NewShop, people: readonly NewPerson[], drawer: readonly DrawerCutter[]): Promise<void> {
    await database.transaction(async (tx) => {
      await tx.insert(shops).values(shop);
      await tx.insert(users).values([...people]);
      const { id: shopId, createdAt: changedAt } = shop;
      await tx.insert(cutters).values(drawer.map((c) => ({ ...c, name: c.cutter.name, shopId, changedAt })));
    });
  },

  async noteSignIn(userId: string, at: Date): Promise<void> {
    await database.queries.update(users).set({ lastSignInAt: at }).where(eq(users.id, userId));
  },

  async endSessionsOf(userId: string): Promise<void> {
    await database.queries.delete(sessions).where(eq(sessions.userId, userId));
  },
});
