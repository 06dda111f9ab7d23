import { writeFrameTable } from '#shared/kernel/frame-table/write-frame-table.ts';
import { safeName } from '../../layer-set/safe-name.ts';
import type { MadeFile } from '../../making/tasks.ts';
import type { FramesService } from './frames.service.ts';

/** The drafts of a job as a table of frames, to read again or for a spreadsheet. Throws 'not-found'. */
export async function writeJobTable(frames: FramesService, shopId: string, jobId: string): Promise<MadeFile> {
  const { jobName, drafts } = await frames.draftsOfJob(shopId, jobId);
  // A spreadsheet takes UTF-8 for another code page when no byte order mark says so.
  const bytes = new TextEncoder().encode(`\uFEFF${writeFrameTable(drafts)}`);
  return { name: `${safeName(jobName, 'job')}_frames.csv`, bytes };
}
