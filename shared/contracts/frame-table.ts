import { z } from 'zod';
import { particulars } from './particulars.ts';

/** Limits of a table of frames: more than a whole kitchen has. */
export const FRAME_TABLE_LIMITS = { frames: 200, csvBytes: 1024 * 1024 } as const;

const { frames: most } = FRAME_TABLE_LIMITS;

/**
 * POST /api/jobs/:jobId/frame-table: the frames of a table that a person has looked at, added to the job in their order,
 * all or none. Names may be in the job already, as with a single frame. Answers frameTableAdded.
 */
export const frameTableRequest = z.strictObject({
  frames: z
    .array(particulars, { error: 'takes a list of frames' })
    .min(1, { error: 'takes at least one frame' })
    .max(most, { error: `takes at most ${most} frames` }),
});
export type FrameTableRequest = z.input<typeof frameTableRequest>;

export const frameTableAdded = z.object({ frames: z.array(z.object({ id: z.string(), name: z.string() })) });
export type FrameTableAdded = z.infer<typeof frameTableAdded>;

// GET /api/jobs/:jobId/frames.csv answers the drafts of a job as such a table (shared/kernel/frame-table).
