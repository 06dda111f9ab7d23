import { randomUUID } from 'node:crypto';
import type { DraftSaved, Frame, RevisionPage, StaleDraft } from '#shared/contracts/frames.ts';
import { listChanges } from '#shared/kernel/particulars/list-changes.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { AppError, notFound } from '../../errors.ts';
import type { SignedIn } from '../../http/signed-in.ts';
import { frozenParticulars } from '../../revisions/frozen-particulars.ts';
import { workOut } from '../../making/work-out.ts';
import type { Makers, WorkedSummary } from '../../making/tasks.ts';
import { describeChanges } from './describe-stale.ts';
import type { Figures, FrameRow, FramesStore } from './frames.store.ts';
import { presentFrame, presentRevision } from './present-frame.ts';

export type FramesService = ReturnType<typeof framesService>;

export interface FramesGiven {
  readonly store: FramesStore;
  readonly makers: Makers;
  readonly now: () => Date;
}

function figuresOf({ findings, ...sizes }: WorkedSummary): Figures {
  const count = (level: string) => findings.filter((f) => f.level === level).length;
  return { ...sizes, stops: count('stop'), cautions: count('caution'), notes: count('note') };
}

const alike = (a: Particulars, b: Particulars): boolean => listChanges(a, b).length === 0;

/** Frames and their drafts. */
export function framesService({ store, makers, now }: FramesGiven) {
  /** The frame of this shop, or 'not-found'. */
  async function mustFind(shopId: string, frameId: string): Promise<FrameRow> {
    const row = await store.find(shopId, frameId);
    if (!row) throw notFound('frame');
    return row;
  }

  /** What to tell an editor whose version is no longer the newest. */
  async function stale(frame: FrameRow, from: number, yours: Particulars | null): Promise<AppError> {
    const base = await store.draftAt(frame.id, from);
    const details: StaleDraft = {
      version: frame.version,
      particulars: frame.particulars as StaleDraft['particulars'],
      changedBy: frame.changedBy,
      changedAt: frame.changedAt.toISOString(),
      changes: describeChanges(base, frame.particulars, yours),
    };
    const message = `${frame.changedBy} has changed this draft since you opened it.`;
    return new AppError('stale-draft', `draft ${frame.id}: version ${from} against ${frame.version}`, {
      message,
      details,
    });
  }

  async function differsFromNewest(frame: FrameRow, particulars: Particulars): Promise<boolean> {
    if (frame.letter === '') return true;
    const newest = await store.findRevision(frame.shopId, frame.id, frame.letter);
    return newest === null || !alike(frozenParticulars(newest), particulars);
  }

  return {
    mustFind,
    stale,
    differsFromNewest,

    async read(shopId: string, frameId: string): Promise<Frame> {
      const frame = await mustFind(shopId, frameId);
      return presentFrame(frame, await store.revisionsOf(shopId, frameId));
    },

    async add(who: SignedIn, jobId: string, particulars: Particulars): Promise<Frame> {
      const [added] = await this.addAll(who, jobId, [particulars]);
      return this.read(who.shopId, added!.id);
    },

    /** Adds all of these frames to a job, or none; `tracingId`: the drawing that they were traced from. */
    async addAll(
      who: SignedIn,
      jobId: string,
      all: readonly Particulars[],
      tracingId?: string,
    ): Promise<{ id: string; name: string }[]> {
      const { shopId } = who;
      if (!(await store.jobExists(shopId, jobId))) throw notFound('job');
      const added = [];
      for (const particulars of all) {
        const figures = figuresOf(await workOut(makers, particulars));
        const draft = { particulars, figures, draftChanged: true, changedAt: now(), changedBy: who.name };
        const traced = tracingId === undefined ? {} : { tracingId };
        added.push({ frame: { id: randomUUID(), shopId, jobId, ...traced }, draft });
      }
      await store.addAll(added);
      return added.map(({ frame, draft }) => ({ id: frame.id, name: draft.particulars.name }));
    },

    /** The drafts of a job in its order, and its name. Throws 'not-found'. */
    async draftsOfJob(shopId: string, jobId: string): Promise<{ jobName: string; drafts: Particulars[] }> {
      const found = await store.draftsOfJob(shopId, jobId);
      if (!found) throw notFound('job');
      return found;
    },

    /** Saves over version `from`. Throws 'stale-draft' when it is no longer the newest; what stands then is not touched. */
    async saveDraft(who: SignedIn, frameId: string, from: number, particulars: Particulars): Promise<DraftSaved> {
      const frame = await mustFind(who.shopId, frameId);
      const saved = (version: number, changedAt: Date, draftChanged: boolean) => ({
        version,
        changedAt: changedAt.toISOString(),
        draftChanged,
      });
      // Saved already: the answer to an earlier try was lost on its way, or nothing was changed.
      if (alike(frame.particulars, particulars)) return saved(frame.version, frame.changedAt, frame.draftChanged);
      if (frame.version !== from) throw await stale(frame, from, particulars);
      const figures = figuresOf(await workOut(makers, particulars));
      const draft = {
        particulars,
        figures,
        draftChanged: await differsFromNewest(frame, particulars),
        changedAt: now(),
        changedBy: who.name,
      };
      const version = await store.saveDraft(who.shopId, frameId, from, frame.letter, draft);
      if (version !== null) return saved(version, draft.changedAt, draft.draftChanged);
      // Somebody was quicker: saved, or released, which leaves the version as it is. Look again.
      return this.saveDraft(who, frameId, from, particulars);
    },

    async setRemoved(shopId: string, frameId: string, removed: boolean): Promise<Frame> {
      if (!(await store.setRemoved(shopId, frameId, removed))) throw notFound('frame');
      return this.read(shopId, frameId);
    },

    async readRevision(shopId: string, frameId: string, letter: string): Promise<RevisionPage> {
      const row = await store.findRevision(shopId, frameId, letter);
      if (!row) throw notFound('revision');
      const particulars = frozenParticulars(row) as RevisionPage['particulars'];
      return { ...presentRevision(row), frameId, jobName: row.jobName, particulars };
    },
  };
}
