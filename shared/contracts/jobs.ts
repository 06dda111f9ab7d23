import { z } from 'zod';
import { LIMITS } from './limits.ts';
import { words } from './words.ts';

const name = words(LIMITS.nameLength);

/** Query of GET /api/jobs and GET /api/jobs/:jobId: `removed=true` lists what was put away instead of what is there. */
export const listQuery = z.strictObject({
  removed: z
    .enum(['true', 'false'])
    .default('false')
    .transform((v) => v === 'true'),
});

/** POST /api/jobs. Answers a job. */
export const jobRequest = z.strictObject({ name });
export type JobRequest = z.input<typeof jobRequest>;

/** PATCH /api/jobs/:jobId: name, or `removed` true to put it away and false to bring it back. Answers a job. */
export const jobChange = z.strictObject({ name: name.optional(), removed: z.boolean().optional() });
export type JobChange = z.input<typeof jobChange>;

export const job = z.object({
  id: z.string(),
  name: z.string(),
  createdAt: z.string(),
  changedAt: z.string(),
  removed: z.boolean(),
});
export type Job = z.infer<typeof job>;

/** GET /api/jobs. */
export const jobList = z.object({
  jobs: z.array(job.extend({ frames: z.number(), released: z.number(), withStops: z.number() })),
});
export type JobList = z.infer<typeof jobList>;

const counts = z.object({ stops: z.number(), cautions: z.number(), notes: z.number() });
export type FindingCounts = z.infer<typeof counts>;

/** A row of a job's table of frames. */
export const frameRow = z.object({
  id: z.string(),
  name: z.string(),
  unit: z.enum(['in', 'mm']),
  width: z.number(),
  height: z.number(),
  openings: z.number(),
  findings: counts,
  /** Newest released letter, '' before the first. */
  revision: z.string(),
  /** True when the draft differs from the newest revision. */
  draftChanged: z.boolean(),
  changedAt: z.string(),
});
export type FrameRow = z.infer<typeof frameRow>;

/** GET /api/jobs/:jobId. */
export const jobPage = z.object({ job, frames: z.array(frameRow) });
export type JobPage = z.infer<typeof jobPage>;
