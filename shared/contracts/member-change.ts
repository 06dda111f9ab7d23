import { z } from 'zod';
import { CHANGEABLE, MAY_BE_NONE, type MemberChange } from '../kernel/starters/member-change.ts';
import { LIMITS } from './limits.ts';

/** Longest length that a change takes, in either unit. */
const LONGEST = 10_000;
const MOST_FRAMES = 500;

const takes = (text: string) => ({ error: `takes ${text}` });
const lengthOrNone = z
  .number(takes('a length, 0 or more'))
  .min(0, takes('a length, 0 or more'))
  .max(LONGEST, takes(`a length up to ${LONGEST}`));

/** One change of a member, or of the board or the dados; see MemberChange in the kernel. */
export const memberChange = z
  .strictObject({
    what: z.enum(CHANGEABLE, takes(CHANGEABLE.map((what) => `"${what}"`).join(' or '))),
    unit: z.enum(['in', 'mm'], takes('"in" or "mm"')),
    to: lengthOrNone,
    from: lengthOrNone.optional(),
  })
  .refine(({ what, to }) => to > 0 || MAY_BE_NONE.includes(what), {
    path: ['to'],
    error: 'takes a length above 0',
  }) satisfies z.ZodType<MemberChange>;

/** Changes for many frames at once, as a person enters them. */
export const memberChangesRequest = z.strictObject({
  changes: z
    .array(memberChange, takes('a list of changes'))
    .min(1, takes('at least one change'))
    .max(CHANGEABLE.length, takes(`at most ${CHANGEABLE.length} changes`)),
  frameIds: z
    .array(z.string().max(LIMITS.nameLength), takes('a list of frames'))
    .min(1, takes('at least one frame'))
    .max(MOST_FRAMES, takes(`at most ${MOST_FRAMES} frames`)),
});
