import { randomUUID } from 'node:crypto';
import type { FrameRow, Job, JobChange, JobList, JobPage } from '#shared/contracts/jobs.ts';
import { notFound } from '../../errors.ts';
import type { JobRow, JobsStore } from './jobs.store.ts';

export type JobsService = ReturnType<typeof jobsService>;

const present = (row: JobRow): Job => ({
  id: row.id,
  name: row.name,
  createdAt: row.createdAt.toISOString(),
  changedAt: row.changedAt.toISOString(),
  removed: row.removed,
});

const presentFrame = (row: Awaited<ReturnType<JobsStore['framesOf']>>[number]): FrameRow => ({
  id: row.id,
  name: row.particulars.name,
  unit: row.particulars.unit,
  width: row.width,
  height: row.height,
  openings: row.openings,
  findings: { stops: row.stops, cautions: row.cautions, notes: row.notes },
  revision: row.letter,
  draftChanged: row.draftChanged,
  changedAt: row.changedAt.toISOString(),
});

const later = (a: Date, b: Date | null): Date => (b !== null && b > a ? b : a);

/** Jobs: one customer's work each. */
export const jobsService = (store: JobsStore, now: () => Date) => ({
  /** The one worked on last comes first. `removed` lists what was put away instead. */
  async list(shopId: string, removed: boolean): Promise<JobList> {
    const jobs = (await store.list(shopId, removed)).map((row) => ({
      ...present({ ...row, changedAt: later(row.changedAt, row.framesChangedAt) }),
      frames: row.frames,
      released: row.released,
      withStops: row.withStops,
    }));
    jobs.sort((a, b) => b.changedAt.localeCompare(a.changedAt) || a.name.localeCompare(b.name));
    return { jobs };
  },

  /** Throws 'not-found'. `removed` lists the frames that were put away instead. */
  async page(shopId: string, jobId: string, removed: boolean): Promise<JobPage> {
    const row = await store.find(shopId, jobId);
    if (!row) throw notFound('job');
    return { job: present(row), frames: (await store.framesOf(shopId, jobId, removed)).map(presentFrame) };
  },

  async add(shopId: string, name: string): Promise<Job> {
    const at = now();
    const row = { id: randomUUID(), name, createdAt: at, changedAt: at, removed: false };
    await store.add({ ...row, shopId });
    return present(row);
  },

  /** Throws 'not-found'. */
  async change(shopId: string, jobId: string, change: JobChange): Promise<Job> {
    const row = await store.change(shopId, jobId, { ...change, changedAt: now() });
    if (!row) throw notFound('job');
    return present(row);
  },
});
