import { and, eq, max, sql } from 'drizzle-orm';
import type { Database } from '../../db/database.ts';
import { frames, jobs } from '../../db/schema.ts';

export type JobsStore = ReturnType<typeof jobsStore>;
export type JobRow = Omit<typeof jobs.$inferSelect, 'shopId'>;

const columns = {
  id: jobs.id,
  name: jobs.name,
  createdAt: jobs.createdAt,
  changedAt: jobs.changedAt,
  removed: jobs.removed,
};
const own = (shopId: string, jobId: string) => and(eq(jobs.shopId, shopId), eq(jobs.id, jobId));

/** How many frames fulfil a condition. Drivers answer counts as text or as numbers. */
const counted = (condition: ReturnType<typeof sql>) =>
  sql<number>`count(*) filter (where ${condition})`.mapWith(Number);

/** Jobs of a shop, with figures of their frames. */
export const jobsStore = (database: Database) => ({
  list: (shopId: string, removed: boolean) =>
    database.queries
      .select({
        ...columns,
        frames: counted(sql`${frames.id} is not null`),
        released: counted(sql`${frames.letter} <> ''`),
        withStops: counted(sql`${frames.stops} > 0`),
        framesChangedAt: max(frames.changedAt),
      })
      .from(jobs)
      .leftJoin(frames, and(eq(frames.jobId, jobs.id), eq(frames.removed, false)))
      .where(and(eq(jobs.shopId, shopId), eq(jobs.removed, removed)))
      .groupBy(jobs.id),

  async find(shopId: string, jobId: string): Promise<JobRow | null> {
    const [row] = await database.queries.select(columns).from(jobs).where(own(shopId, jobId));
    return row ?? null;
  },

  framesOf: (shopId: string, jobId: string, removed: boolean) =>
    database.queries
      .select({
        id: frames.id,
        particulars: frames.particulars,
        width: frames.width,
        height: frames.height,
        openings: frames.openings,
        stops: frames.stops,
        cautions: frames.cautions,
        notes: frames.notes,
        letter: frames.letter,
        draftChanged: frames.draftChanged,
        changedAt: frames.changedAt,
      })
      .from(frames)
      .where(and(eq(frames.shopId, shopId), eq(frames.jobId, jobId), eq(frames.removed, removed)))
      .orderBy(frames.ordinal),

  async add(row: typeof jobs.$inferInsert): Promise<void> {
    await database.queries.insert(jobs).values(row);
  },

  /** Null when the shop has no such job. */
  async change(
    shopId: string,
    jobId: string,
    change: { name?: string; removed?: boolean; changedAt: Date },
  ): Promise<JobRow | null> {
    const [row] = await database.queries.update(jobs).set(change).where(own(shopId, jobId)).returning(columns);
    return row ?? null;
  },
});
