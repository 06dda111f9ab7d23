import { and, desc, eq, lte } from 'drizzle-orm';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import type { Database } from '../../db/database.ts';
import { draftVersions, frames, jobs, revisions, shops, tracings } from '../../db/schema.ts';

export type FramesStore = ReturnType<typeof framesStore>;
/** `tracedFrom`: name of the drawing that it was traced from. */
export type FrameRow = typeof frames.$inferSelect & { jobName: string; shopName: string; tracedFrom: string | null };
export type RevisionRow = typeof revisions.$inferSelect;
/** A revision without its frozen bytes. */
export type RevisionLine = Pick<RevisionRow, 'letter' | 'note' | 'author' | 'releasedAt' | 'sha256'>;

/** The figures of a draft that tables show. */
export type Figures = Pick<FrameRow, 'width' | 'height' | 'openings' | 'stops' | 'cautions' | 'notes'>;

export interface Draft {
  readonly particulars: Particulars;
  readonly figures: Figures;
  readonly draftChanged: boolean;
  readonly changedAt: Date;
  readonly changedBy: string;
}

export interface NewFrame {
  readonly id: string;
  readonly shopId: string;
  readonly jobId: string;
  /** The drawing that it was traced from. */
  readonly tracingId?: string;
}

/** Versions of a draft that are kept to compare with. */
const VERSIONS_KEPT = 200;

const own = (shopId: string, frameId: string) => and(eq(frames.shopId, shopId), eq(frames.id, frameId));

/** Frames, their drafts and their revisions. */
export const framesStore = (database: Database) => ({
  async jobExists(shopId: string, jobId: string): Promise<boolean> {
    const rows = await database.queries
      .select({ id: jobs.id })
      .from(jobs)
      .where(and(eq(jobs.shopId, shopId), eq(jobs.id, jobId)));
    return rows.length > 0;
  },

  async find(shopId: string, frameId: string): Promise<FrameRow | null> {
    const [row] = await database.queries
      .select({ frame: frames, jobName: jobs.name, shopName: shops.name, tracedFrom: tracings.fileName })
      .from(frames)
      .innerJoin(jobs, eq(jobs.id, frames.jobId))
      .innerJoin(shops, eq(shops.id, frames.shopId))
      .leftJoin(tracings, eq(tracings.id, frames.tracingId))
      .where(own(shopId, frameId));
    if (!row) return null;
    const { frame, ...named } = row;
    return { ...frame, ...named };
  },

  /** All of them or none, in this order. */
  addAll: (added: readonly { frame: NewFrame; draft: Draft }[]): Promise<void> =>
    database.transaction(async (tx) => {
      for (const { frame, draft } of added) {
        const { figures, ...rest } = draft;
        await tx.insert(frames).values({ ...frame, ...rest, ...figures, version: 1, createdAt: draft.changedAt });
        await tx.insert(draftVersions).values({ frameId: frame.id, version: 1, particulars: draft.particulars });
      }
    }),

  /** The drafts of a job in its order, without those put away, and its name; null when the shop has no such job. */
  async draftsOfJob(shopId: string, jobId: string): Promise<{ jobName: string; drafts: Particulars[] } | null> {
    const [job] = await database.queries
      .select({ name: jobs.name })
      .from(jobs)
      .where(and(eq(jobs.shopId, shopId), eq(jobs.id, jobId)));
    if (!job) return null;
    const rows = await database.queries
      .select({ particulars: frames.particulars })
      .from(frames)
      .where(and(eq(frames.shopId, shopId), eq(frames.jobId, jobId), eq(frames.removed, false)))
      .orderBy(frames.ordinal);
    return { jobName: job.name, drafts: rows.map(({ particulars }) => particulars) };
  },

  /** Saves over version `from` as it stands after revision `letter`. Null when either is no longer so; nothing is saved then. */
  saveDraft: (shopId: string, frameId: string, from: number, letter: string, draft: Draft): Promise<number | null> =>
    database.transaction(async (tx) => {
      const { figures, ...rest } = draft;
      const version = from + 1;
      const saved = await tx
        .update(frames)
        .set({ ...rest, ...figures, version })
        .where(and(own(shopId, frameId), eq(frames.version, from), eq(frames.letter, letter)))
        .returning({ version: frames.version });
      if (saved.length === 0) return null;
      await tx.insert(draftVersions).values({ frameId, version, particulars: draft.particulars });
      await tx
        .delete(draftVersions)
        .where(and(eq(draftVersions.frameId, frameId), lte(draftVersions.version, version - VERSIONS_KEPT)));
      return version;
    }),

  /** The draft as it was; null when that version is not kept. */
  async draftAt(frameId: string, version: number): Promise<Particulars | null> {
    const [row] = await database.queries
      .select({ particulars: draftVersions.particulars })
      .from(draftVersions)
      .where(and(eq(draftVersions.frameId, frameId), eq(draftVersions.version, version)));
    return row?.particulars ?? null;
  },

  async setRemoved(shopId: string, frameId: string, removed: boolean): Promise<boolean> {
    const rows = await database.queries
      .update(frames)
      .set({ removed })
      .where(own(shopId, frameId))
      .returning({ id: frames.id });
    return rows.length > 0;
  },

  /** Newest first. */
  revisionsOf: (shopId: string, frameId: string): Promise<RevisionLine[]> =>
    database.queries
      .select({
        letter: revisions.letter,
        note: revisions.note,
        author: revisions.author,
        releasedAt: revisions.releasedAt,
        sha256: revisions.sha256,
      })
      .from(revisions)
      .where(and(eq(revisions.shopId, shopId), eq(revisions.frameId, frameId)))
      .orderBy(desc(revisions.ordinal)),

  async findRevision(shopId: string, frameId: string, letter: string): Promise<RevisionRow | null> {
    const [row] = await database.queries
      .select()
      .from(revisions)
      .where(and(eq(revisions.shopId, shopId), eq(revisions.frameId, frameId), eq(revisions.letter, letter)));
    return row ?? null;
  },

  /** Freezes version `version` of the draft. False when the draft or its newest letter is no longer what it was. */
  release: (revision: Omit<RevisionRow, 'ordinal'>, version: number, after: string): Promise<boolean> =>
    database.transaction(async (tx) => {
      const { shopId, frameId, letter } = revision;
      const released = await tx
        .update(frames)
        .set({ letter, draftChanged: false })
        .where(and(own(shopId, frameId), eq(frames.version, version), eq(frames.letter, after)))
        .returning({ id: frames.id });
      if (released.length === 0) return false;
      const ordinal = (await tx.$count(revisions, eq(revisions.frameId, frameId))) + 1;
      await tx.insert(revisions).values({ ...revision, ordinal });
      return true;
    }),
});
