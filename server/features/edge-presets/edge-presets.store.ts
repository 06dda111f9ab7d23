import { and, count, eq } from 'drizzle-orm';
import type { StoredEdgePreset } from '#shared/contracts/edge-presets.ts';
import type { EdgePreset } from '#shared/kernel/starters/edge-preset.ts';
import type { Database } from '../../db/database.ts';
import { edgePresets } from '../../db/schema.ts';

export type EdgePresetsStore = ReturnType<typeof edgePresetsStore>;
export interface EdgePresetRow {
  readonly id: string;
  readonly preset: EdgePreset;
}

/** Edges that a shop saved. A name that is taken in the shop, whatever its case, is a unique violation. */
export const edgePresetsStore = (database: Database) => ({
  list: (shopId: string): Promise<EdgePresetRow[]> =>
    database.queries
      .select({ id: edgePresets.id, preset: edgePresets.preset })
      .from(edgePresets)
      .where(eq(edgePresets.shopId, shopId)),

  async count(shopId: string): Promise<number> {
    const [row] = await database.queries
      .select({ is: count() })
      .from(edgePresets)
      .where(eq(edgePresets.shopId, shopId));
    return row?.is ?? 0;
  },

  async add(shopId: string, { id, preset }: StoredEdgePreset, changedAt: Date): Promise<void> {
    await database.queries.insert(edgePresets).values({ id, shopId, name: preset.name, preset, changedAt });
  },

  /** False when the shop has no such preset. */
  async remove(shopId: string, id: string): Promise<boolean> {
    const rows = await database.queries
      .delete(edgePresets)
      .where(and(eq(edgePresets.shopId, shopId), eq(edgePresets.id, id)))
      .returning({ id: edgePresets.id });
    return rows.length > 0;
  },
});
