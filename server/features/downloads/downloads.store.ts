import { and, eq } from 'drizzle-orm';
import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import type { Paper } from '#shared/contracts/session.ts';
import type { Database } from '../../db/database.ts';
import { frames, jobs, profiles, revisions, shops } from '../../db/schema.ts';

export type DownloadsStore = ReturnType<typeof downloadsStore>;
export type StoredRevision = typeof revisions.$inferSelect;

/** What is needed to make files. */
export const downloadsStore = (database: Database) => ({
  async shopPapers(shopId: string): Promise<{ name: string; paper: Paper; defaultProfileId: string }> {
    const [row] = await database.queries
      .select({ name: shops.name, paper: shops.paper, defaultProfileId: shops.defaultProfileId })
      .from(shops)
      .where(eq(shops.id, shopId));
    if (!row) throw new Error(`no shop ${shopId}`);
    return row;
  },

  async findProfile(shopId: string, profileId: string): Promise<FileProfile | null> {
    const [row] = await database.queries
      .select({ profile: profiles.profile })
      .from(profiles)
      .where(and(eq(profiles.shopId, shopId), eq(profiles.id, profileId)));
    return row?.profile ?? null;
  },

  async findDraft(shopId: string, frameId: string) {
    const [row] = await database.queries
      .select({
        particulars: frames.particulars,
        changedAt: frames.changedAt,
        changedBy: frames.changedBy,
        jobName: jobs.name,
      })
      .from(frames)
      .innerJoin(jobs, eq(jobs.id, frames.jobId))
      .where(and(eq(frames.shopId, shopId), eq(frames.id, frameId)));
    return row ?? null;
  },

  async findRevision(shopId: string, frameId: string, letter: string): Promise<StoredRevision | null> {
    const [row] = await database.queries
      .select()
      .from(revisions)
      .where(and(eq(revisions.shopId, shopId), eq(revisions.frameId, frameId), eq(revisions.letter, letter)));
    return row ?? null;
  },

  async findJob(shopId: string, jobId: string): Promise<{ name: string } | null> {
    const [row] = await database.queries
      .select({ name: jobs.name })
      .from(jobs)
      .where(and(eq(jobs.shopId, shopId), eq(jobs.id, jobId)));
    return row ?? null;
  },

  /** The newest revision of each frame that is not put away and has one, in the order of the job. */
  async newestRevisions(shopId: string, jobId: string): Promise<StoredRevision[]> {
    const rows = await database.queries
      .select({ revision: revisions })
      .from(frames)
      .innerJoin(revisions, and(eq(revisions.frameId, frames.id), eq(revisions.letter, frames.letter)))
      .where(and(eq(frames.shopId, shopId), eq(frames.jobId, jobId), eq(frames.removed, false)))
      .orderBy(frames.ordinal);
    return rows.map((row) => row.revision);
  },

  /** Names of the frames that are not put away and have no revision. */
  async unreleased(shopId: string, jobId: string): Promise<string[]> {
    const rows = await database.queries
      .select({ particulars: frames.particulars })
      .from(frames)
      .where(and(eq(frames.shopId, shopId), eq(frames.jobId, jobId), eq(frames.removed, false), eq(frames.letter, '')))
      .orderBy(frames.ordinal);
    return rows.map((row) => row.particulars.name);
  },
});
