import { and, eq } from 'drizzle-orm';
import type { Shop } from '#shared/contracts/session.ts';
import type { Database } from '../../db/database.ts';
import { profiles, shops } from '../../db/schema.ts';

export type ShopStore = ReturnType<typeof shopStore>;

/** A shop's own settings. */
export const shopStore = (database: Database) => ({
  async change(shopId: string, change: Partial<Omit<Shop, 'id'>>): Promise<Shop> {
    const columns = {
      id: shops.id,
      name: shops.name,
      unit: shops.unit,
      paper: shops.paper,
      defaultProfileId: shops.defaultProfileId,
    };
    const [row] =
      Object.keys(change).length === 0
        ? await database.queries.select(columns).from(shops).where(eq(shops.id, shopId))
        : await database.queries.update(shops).set(change).where(eq(shops.id, shopId)).returning(columns);
    if (!row) throw new Error(`no shop ${shopId}`);
    return row;
  },

  async ownsProfile(shopId: string, profileId: string): Promise<boolean> {
    const rows = await database.queries
      .select({ id: profiles.id })
      .from(profiles)
      .where(and(eq(profiles.shopId, shopId), eq(profiles.id, profileId)));
    return rows.length > 0;
  },
});
