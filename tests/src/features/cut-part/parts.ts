import { boardExtents, cutBoard, finishedStage } from '#shared/kernel/height-field/cut-board.ts';
import type { CutPart } from '#shared/kernel/height-field/cut-part.ts';
import { makeGrid } from '#shared/kernel/height-field/grid.ts';
import { runThrough } from '#shared/kernel/height-field/sweep-face.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { BUILTIN_PROFILES } from '#shared/kernel/profiles/builtin-profiles.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { dado, workedExample } from '../../../builders/worked-example.ts';
import type { FrameFiles } from '../../../../src/features/cut-part/sweeping/workshop-client.ts';

/** A frame of 8 × 8 with one opening and one dado, small enough to be cut in no time. */
export const smallFrame = (changes: Partial<Particulars> = {}): Particulars =>
  workedExample({
    outline: {
      kind: 'members',
      width: 8,
      height: 8,
      stiles: { left: 1.75, right: 1.75 },
      rails: { top: 1.75, bottom: 1.75 },
      feet: 0,
      layout: { opening: { label: 'A' } },
    },
    dados: [dado({ from: 0, to: 8 })],
    ...changes,
  });

export const filesOf = (particulars: Particulars): FrameFiles => ({
  worked: workFrame(particulars),
  profile: BUILTIN_PROFILES[0]!.profile,
});

export function cutWhole(particulars: Particulars, cell: number): CutPart {
  const { worked, profile } = filesOf(particulars);
  const stage = finishedStage(worked, profile);
  return runThrough(cutBoard(stage, makeGrid(boardExtents(worked, stage), cell)));
}
