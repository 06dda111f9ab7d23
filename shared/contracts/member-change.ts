import { z } from 'zod';
import { CHANGEABLE, MAY_BE_NONE, type MemberChange } from '../kernel/starters/member-change.ts';

/** Longest length that a change takes, in either unit. */
const LONGEST = 10_000;
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
