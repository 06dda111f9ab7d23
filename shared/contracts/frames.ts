import { z } from 'zod';
import { particulars } from './particulars.ts';
import { LIMITS } from './limits.ts';
import { lines, words } from './words.ts';

/** POST /api/jobs/:jobId/frames. Answers a frame. */
export const frameRequest = z.strictObject({ particulars });
export type FrameRequest = z.input<typeof frameRequest>;

export const revision = z.object({
  letter: z.string(),
  note: z.string(),
  author: z.string(),
  releasedAt: z.string(),
  /** SHA-256 of the frozen frame file. */
  sha256: z.string(),
});
export type Revision = z.infer<typeof revision>;

/** GET /api/frames/:frameId. */
export const frame = z.object({
  id: z.string(),
  jobId: z.string(),
  jobName: z.string(),
  /** The draft and its version number. */
  particulars,
  version: z.number().int(),
  changedAt: z.string(),
  changedBy: z.string(),
  removed: z.boolean(),
  /** Newest first. */
  revisions: z.array(revision),
  /** True when the draft differs from the newest revision. */
  draftChanged: z.boolean(),
  /** The drawing that it was traced from. */
  tracing: z.object({ id: z.string(), fileName: z.string() }).nullable(),
});
export type Frame = z.infer<typeof frame>;

/** PUT /api/frames/:frameId/draft: `version` is the one the editor started from. Answers draftSaved, or 409 'stale-draft' with staleDraft. */
export const draftRequest = z.strictObject({ version: z.number().int().min(1), particulars });
export type DraftRequest = z.input<typeof draftRequest>;

export const draftSaved = z.object({ version: z.number().int(), changedAt: z.string(), draftChanged: z.boolean() });
export type DraftSaved = z.infer<typeof draftSaved>;

/** `details` of 'stale-draft': the draft as it is now, and what was changed since the version the editor started from, by field. */
export const staleDraft = z.object({
  version: z.number().int(),
  particulars,
  changedBy: z.string(),
  changedAt: z.string(),
  /** `was`: at the version the editor started from, when that is still kept. At most 200 are listed. */
  changes: z.array(z.object({ path: z.string(), yours: z.string(), theirs: z.string(), was: z.string().optional() })),
});
export type StaleDraft = z.infer<typeof staleDraft>;

/**
 * POST /api/frames/:frameId/revisions: freezes draft `version` under the next letter. Cautions must be acknowledged by code.
 * Answers a frame; 422 'frame-has-stops', 422 'cautions-not-acknowledged', 422 'nothing-changed', 422 'proof-failed', 409 'stale-draft'.
 */
export const releaseRequest = z.strictObject({
  version: z.number().int().min(1),
  note: lines(LIMITS.noteLength).default(''),
  acknowledged: z.array(words(100)).max(100).default([]),
});
export type ReleaseRequest = z.input<typeof releaseRequest>;

/** `details` of 'frame-has-stops' and 'cautions-not-acknowledged': the findings that are in the way. */
export const releaseRefused = z.object({
  findings: z.array(z.object({ code: z.string(), text: z.string(), remedy: z.string() })),
});
export type ReleaseRefused = z.infer<typeof releaseRefused>;

/** PATCH /api/frames/:frameId: `removed` true to put it away and false to bring it back. Answers a frame. */
export const frameChange = z.strictObject({ removed: z.boolean() });
export type FrameChange = z.input<typeof frameChange>;

/** GET /api/frames/:frameId/revisions/:letter: one frozen revision. */
export const revisionPage = revision.extend({ frameId: z.string(), jobName: z.string(), particulars });
export type RevisionPage = z.infer<typeof revisionPage>;

/**
 * POST /api/jobs/:jobId/frame-files (multipart, field `files`): several frame files at once.
 * Good ones are taken, bad ones answered by name with their field errors; nothing half-saved of one file.
 */
export const frameFilesTaken = z.object({
  taken: z.array(z.object({ file: z.string(), frameId: z.string(), name: z.string() })),
  refused: z.array(
    z.object({
      file: z.string(),
      message: z.string(),
      fields: z.array(z.object({ path: z.string(), message: z.string(), got: z.string(), takes: z.string() })),
    }),
  ),
});
export type FrameFilesTaken = z.infer<typeof frameFilesTaken>;

/**
 * Downloads (any role of the shop):
 *   GET /api/frames/:frameId/revisions/:letter/layer-set.zip?profile=ID
 *   GET /api/frames/:frameId/revisions/:letter/setup-sheet.pdf?profile=ID
 *   GET /api/frames/:frameId/revisions/:letter/frame-file
 *   GET /api/frames/:frameId/draft/setup-sheet.pdf        marked "draft, not for cutting"
 *   GET /api/frames/:frameId/draft/frame-file
 *   GET /api/jobs/:jobId/layer-sets.zip?profile=ID        newest revision of each frame that has one
 */
export const downloadQuery = z.strictObject({ profile: words(100).optional() });
