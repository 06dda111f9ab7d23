import { z } from 'zod';
import type { Box } from '../kernel/box/box.ts';
import { MOST_PARTITIONS } from '../kernel/box/box-limits.ts';
import { checkBox } from '../kernel/box/check-box.ts';
import { newFrame } from '../kernel/particulars/new-frame.ts';
import { LIMITS } from './limits.ts';
import { words } from './words.ts';

/** Longest length that a box takes, in either unit; the frame's sheet is held against it in the kernel. */
const LONGEST = 10_000;

const takes = (text: string) => ({ error: `takes ${text}` });
const upTo = takes(`a length up to ${LONGEST}`);
const length = z.number(takes('a length above 0')).gt(0, takes('a length above 0')).max(LONGEST, upTo);
const lengthOrNone = z.number(takes('a length, 0 or more')).min(0, takes('a length, 0 or more')).max(LONGEST, upTo);
const overhang = z
  .number(takes('a length; negative where the box stands out past the frame'))
  .min(-LONGEST, takes(`a length from -${LONGEST}`))
  .max(LONGEST, upTo);

const partitionCount = `a whole number from 1 to ${MOST_PARTITIONS}`;
const places = z.discriminatedUnion('kind', [
  z.strictObject({
    kind: z.literal('given'),
    at: z
      .array(lengthOrNone, takes('the left face of each partition, from the box’s left outside'))
      .min(1, takes('at least one partition'))
      .max(MOST_PARTITIONS, takes(`at most ${MOST_PARTITIONS} partitions`)),
  }),
  z.strictObject({
    kind: z.enum(['equal openings', 'equal spaces']),
    count: z
      .number(takes(partitionCount))
      .int(takes(partitionCount))
      .min(1, takes(partitionCount))
      .max(MOST_PARTITIONS, takes(partitionCount)),
  }),
]);

const top = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('panel'), thickness: length, down: lengthOrNone }),
  z.strictObject({ kind: z.literal('stretcher'), thickness: length, down: lengthOrNone, width: length }),
]);

/** A box as a person enters it; see Box in the kernel for the meaning of each field. A box whose frame cannot be cut is refused field by field. */
export const box = z
  .strictObject({
    name: words(LIMITS.nameLength),
    unit: z.enum(['in', 'mm'], takes('"in" or "mm"')),
    width: length,
    height: length,
    depth: length.optional(),
    ends: z.strictObject({ thickness: length }),
    bottom: z.strictObject({ thickness: length, up: lengthOrNone }),
    top: top.optional(),
    partitions: z.strictObject({ thickness: length, places }).optional(),
    overhang: z.strictObject({ left: overhang, right: overhang, top: overhang, bottom: overhang }),
    reveal: z.strictObject({
      left: lengthOrNone,
      right: lengthOrNone,
      top: lengthOrNone,
      bottom: lengthOrNone,
      partition: lengthOrNone,
    }),
    feet: lengthOrNone,
    dado: z.strictObject({
      depth: length,
      clearance: lengthOrNone,
      run: z.enum(['open', 'stopped'], takes('"open" or "stopped"')),
    }),
    letIn: lengthOrNone,
  })
  .superRefine((value, ctx) => {
    // Entries are held against one another only when each is right by itself.
    if (ctx.issues.length > 0) return;
    for (const { field, takes: wanted } of checkBox(value, newFrame(value.unit, value.name)))
      ctx.addIssue({
        code: 'custom',
        path: field.split('.').map((key) => (/^\d+$/.test(key) ? Number(key) : key)),
        message: `takes ${wanted}`,
      });
  }) satisfies z.ZodType<Box>;
