import { workFrame } from '#shared/kernel/work-frame.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import type { WorkedSummary } from './tasks.ts';

/** Works a frame out and keeps what tables and release rules need. */
export function summarizeFrame(particulars: Particulars): WorkedSummary {
  const { contours, findings } = workFrame(particulars);
  return { width: contours.width, height: contours.height, openings: contours.openings.length, findings };
}
