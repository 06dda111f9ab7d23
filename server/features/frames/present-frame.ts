import type { Frame, Revision } from '#shared/contracts/frames.ts';
import type { FrameRow, RevisionLine } from './frames.store.ts';

export const presentRevision = (row: RevisionLine): Revision => ({
  letter: row.letter,
  note: row.note,
  author: row.author,
  releasedAt: row.releasedAt.toISOString(),
  sha256: row.sha256,
});

export const presentFrame = (row: FrameRow, revisions: readonly RevisionLine[]): Frame => ({
  id: row.id,
  jobId: row.jobId,
  jobName: row.jobName,
  particulars: row.particulars as Frame['particulars'],
  version: row.version,
  changedAt: row.changedAt.toISOString(),
  changedBy: row.changedBy,
  removed: row.removed,
  revisions: revisions.map(presentRevision),
  draftChanged: row.draftChanged,
  tracing: row.tracingId === null || row.tracedFrom === null ? null : { id: row.tracingId, fileName: row.tracedFrom },
});
