import { and, count, eq } from 'drizzle-orm';
import type { DrawerCutter, DrawerEntry } from '#shared/kernel/cutter-drawer/drawer-cutter.ts';
import type { Database } from '../../db/database.ts';
import { cutters, frames, jobs } from '../../db/schema.ts';

export type CuttersStore = ReturnType<typeof cuttersStore>;

const own = (shopId: string, id: string) => and(eq(cutters.shopId, shopId), eq(cutters.id, id));
const columns = { id: cutters.id, unit: cutters.unit, cutter: cutters.cutter, remarks: cutters.remarks };
const valuesOf = ({ unit, cutter, remarks }: DrawerEntry, changedAt: Date) => ({
  name: cutter.name,
  unit,
  cutter,
  remarks,
  changedAt,
});

const rowOf = (shopId: string, entry: DrawerCutter, changedAt: Date) => ({
  id: entry.id,
  shopId,
  ...valuesOf(entry, changedAt),
});

/** Undoes the transaction. */
class GoneMeanwhile extends Error {
  override readonly name = 'GoneMeanwhile';
}

/** A shop's cutter drawer. A name that is taken in the shop, whatever its case, is a unique violation. */
export const cuttersStore = (database: Database) => ({
  list: (shopId: string): Promise<DrawerCutter[]> =>
    database.queries.select(columns).from(cutters).where(eq(cutters.shopId, shopId)),

  async count(shopId: string): Promise<number> {
    const [row] = await database.queries.select({ is: count() }).from(cutters).where(eq(cutters.shopId, shopId));
    return row?.is ?? 0;
  },

  async find(shopId: string, id: string): Promise<DrawerCutter | null> {
    const [row] = await database.queries.select(columns).from(cutters).where(own(shopId, id));
    return row ?? null;
  },

  /** All of them or none. */
  async add(shopId: string, entries: readonly DrawerCutter[], changedAt: Date): Promise<void> {
    if (entries.length === 0) return;
    await database.queries.insert(cutters).values(entries.map((entry) => rowOf(shopId, entry, changedAt)));
  },

  /** Puts in and changes, all or none. False, and nothing done, when one to change is no longer there. */
  take: (
    shopId: string,
    added: readonly DrawerCutter[],
    changed: readonly DrawerCutter[],
    changedAt: Date,
  ): Promise<boolean> =>
    database
      .transaction(async (tx) => {
        for (const { id, ...entry } of changed) {
          const rows = await tx
            .update(cutters)
            .set(valuesOf(entry, changedAt))
            .where(own(shopId, id))
            .returning({ id: cutters.id });
          if (rows.length === 0) throw new GoneMeanwhile(id);
        }
        if (added.length > 0) await tx.insert(cutters).values(added.map((entry) => rowOf(shopId, entry, changedAt)));
        return true;
      })
      .catch((error: unknown) => {
        if (error instanceof GoneMeanwhile) return false;
        throw error;
      }),

  /** False when the shop has no such cutter. */
  async change(shopId: string, id: string, entry: DrawerEntry, changedAt: Date): Promise<boolean> {
    const rows = await database.queries
      .update(cutters)
      .set(valuesOf(entry, changedAt))
      .where(own(shopId, id))
      .returning({ id: cutters.id });
    return rows.length > 0;
  },

  /** False when the shop has no such cutter. */
  async remove(shopId: string, id: string): Promise<boolean> {
    const rows = await database.queries.delete(cutters).where(own(shopId, id)).returning({ id: cutters.id });
    return rows.length > 0;
  },

  /** The shop's drafts, but for those put away, in order of entry. */
  drafts: (shopId: string) =>
    database.queries
      .select({ frameId: frames.id, particulars: frames.particulars, jobName: jobs.name })
      .from(frames)
      .innerJoin(jobs, eq(jobs.id, frames.jobId))
      .where(and(eq(frames.shopId, shopId), eq(frames.removed, false), eq(jobs.removed, false)))
      .orderBy(frames.ordinal),
});
