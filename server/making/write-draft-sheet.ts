import { describeSheet } from '#shared/kernel/sheet/describe-sheet.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { writeSetupSheet } from '../pdf/write-setup-sheet.ts';
import type { DraftSheetInput } from './tasks.ts';

/** The setup sheet of a draft: marked as one, without a proof, and there even when the frame has stops. */
export function writeDraftSheet({ particulars, paper, changedAt, ...context }: DraftSheetInput): Promise<Uint8Array> {
  const model = describeSheet(workFrame(particulars), {
    ...context,
    revision: '',
    releasedAt: changedAt,
    note: '',
    proof: null,
  });
  return writeSetupSheet(model, paper);
}
