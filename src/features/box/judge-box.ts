import { box as boxContract } from '#shared/contracts/box.ts';
import { fieldErrors } from '#shared/contracts/field-errors.ts';
import type { Box } from '#shared/kernel/box/box.ts';
import type { BoxProblem } from '#shared/kernel/box/box-problem.ts';
import { frameFromBox } from '#shared/kernel/box/frame-from-box.ts';
import { newFrame } from '#shared/kernel/particulars/new-frame.ts';
import { applyEdgePreset } from '#shared/kernel/starters/apply-edge-preset.ts';
import type { EdgePreset } from '#shared/kernel/starters/edge-preset.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import type { WorkedFrame } from '#shared/kernel/worked-frame.ts';
import { fieldMessages, type FieldMessages } from '../../lib/field-messages.ts';

export interface JudgedBox {
  /** The frame that covers the box; `undefined` when there is none. */
  readonly worked: WorkedFrame | undefined;
  /** What is wrong, by entry; under '' what is wrong with the frame as a whole. Nothing when it may be created. */
  readonly wrong: FieldMessages;
}

const byField = (problems: readonly BoxProblem[]): FieldMessages =>
  Object.fromEntries(
    problems
      .toReversed()
      .map(({ field, got, takes }) => [field, field === '' ? `${got} ${takes}`.trim() : `Got ${got}; takes ${takes}.`]),
  );

/** A box as entered, held against its contract and against the frame that follows from it. */
export function judgeBox(entered: Box, edge: EdgePreset): JudgedBox {
  const made = frameFromBox(entered, applyEdgePreset(newFrame(entered.unit, entered.name), edge));
  const read = boxContract.safeParse(entered);
  return {
    worked: made.ok ? workFrame(made.particulars) : undefined,
    wrong: {
      ...(read.success ? {} : fieldMessages(fieldErrors(read.error, entered))),
      // Of the two, the kernel says its lengths with their unit.
      ...(made.ok ? {} : byField(made.problems)),
    },
  };
}
