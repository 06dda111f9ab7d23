import { and, eq } from 'drizzle-orm';
import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import type { Database } from '../../db/database.ts';
import { profiles, shops } from '../../db/schema.ts';

export type ProfilesStore = ReturnType<typeof profilesStore>;

const own = (shopId: string, id: string) => and(eq(profiles.shopId, shopId), eq(profiles.id, id));
const columns = { id: profiles.id, profile: profiles.profile };

/** A shop's own file profiles. A name that is taken in the shop, whatever its case, is a unique violation. */
export const profilesStore = (database: Database) => ({
  list: (shopId: string): Promise<{ id: string; profile: FileProfile }[]> =>
    database.queries.select(columns).from(profiles).where(eq(profiles.shopId, shopId)),

  async add(shopId: string, id: string, profile: FileProfile, changedAt: Date): Promise<void> {
    await database.queries.insert(profiles).values({ id, shopId, name: profile.name, profile, changedAt });
  },

  /** False when the shop has no such profile. */
  async change(shopId: string, id: string, profile: FileProfile, changedAt: Date): Promise<boolean> {
    const rows = await database.queries
      .update(profiles)
      .set({ name: profile.name, profile, changedAt })
      .where(own(shopId, id))
      .returning({ id: profiles.id });
    return rows.length > 0;
  },

  /** Where it was the shop's default, `instead` becomes that. False when the shop has no such profile. */
  remove: (shopId: string, id: string, instead: string): Promise<boolean> =>
    database.transaction(async (tx) => {
      const rows = await tx.delete(profiles).where(own(shopId, id)).returning({ id: profiles.id });
      await tx
        .update(shops)
        .set({ defaultProfileId: instead })
        .where(and(eq(shops.id, shopId), eq(shops.defaultProfileId, id)));
      return rows.length > 0;
    }),
});
