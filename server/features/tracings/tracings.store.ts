import { and, desc, eq, inArray } from 'drizzle-orm';
import type { Database } from '../../db/database.ts';
import { frames, jobs, tracings } from '../../db/schema.ts';

export type TracingsStore = ReturnType<typeof tracingsStore>;
export type TracingRow = typeof tracings.$inferSelect & { jobName: string };

const own = (shopId: string, tracingId: string) => and(eq(tracings.shopId, shopId), eq(tracings.id, tracingId));

/** Uploaded drawings of a shop. */
export const tracingsStore = (database: Database) => ({
  async jobExists(shopId: string, jobId: string): Promise<boolean> {
    const rows = await database.queries
      .select({ id: jobs.id })
      .from(jobs)
      .where(and(eq(jobs.shopId, shopId), eq(jobs.id, jobId)));
    return rows.length > 0;
  },

  async add(row: typeof tracings.$inferInsert): Promise<void> {
    await database.queries.insert(tracings).values(row);
  },

  async find(shopId: string, tracingId: string): Promise<TracingRow | null> {
    const [row] = await database.queries
      .select({ tracing: tracings, jobName: jobs.name })
      .from(tracings)
      .innerJoin(jobs, eq(jobs.id, tracings.jobId))
      .where(own(shopId, tracingId));
    return row ? { ...row.tracing, jobName: row.jobName } : null;
  },

  /** Those not put away, newest first. */
  async listOf(shopId: string, jobId: string): Promise<TracingRow[]> {
    const rows = await database.queries
      .select({ tracing: tracings, jobName: jobs.name })
      .from(tracings)
      .innerJoin(jobs, eq(jobs.id, tracings.jobId))
      .where(and(eq(tracings.shopId, shopId), eq(tracings.jobId, jobId), eq(tracings.removed, false)))
      .orderBy(desc(tracings.uploadedAt), desc(tracings.id));
    return rows.map((row) => ({ ...row.tracing, jobName: row.jobName }));
  },

  /** Frames that came of these drawings and are not put away, in the order that they were added. */
  framesOf: (shopId: string, tracingIds: readonly string[]) =>
    database.queries
      .select({ id: frames.id, particulars: frames.particulars, tracingId: frames.tracingId })
      .from(frames)
      .where(and(eq(frames.shopId, shopId), inArray(frames.tracingId, [...tracingIds]), eq(frames.removed, false)))
      .orderBy(frames.ordinal),

  async setRemoved(shopId: string, tracingId: string, removed: boolean): Promise<boolean> {
    const rows = await database.queries
      .update(tracings)
      .set({ removed })
      .where(own(shopId, tracingId))
      .returning({ id: tracings.id });
    return rows.length > 0;
  },
});
