import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { summarizeFrame } from './summarize-frame.ts';
import type { Makers, WorkedSummary } from './tasks.ts';

/** Traced outlines with more vertices than this are worked out by a worker: some checks hold every segment against every other. */
const VERTICES_AT_ONCE = 600;

/** Works a frame out: on the spot when that takes about a millisecond, in a worker when it may take longer. */
export async function workOut(makers: Makers, particulars: Particulars): Promise<WorkedSummary> {
  const { outline } = particulars;
  const vertices =
    outline.kind === 'traced' ? outline.openings.reduce((n, o) => n + o.length, outline.perimeter.length) : 0;
  return vertices > VERTICES_AT_ONCE ? makers.make('summary', particulars) : summarizeFrame(particulars);
}
