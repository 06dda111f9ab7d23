import { z } from 'zod';
import type { Cutter, CutterRole } from '../kernel/cutters/cutter.ts';
import type { CutterRefs, DrawerEntry } from '../kernel/cutter-drawer/drawer-cutter.ts';
import { LIMITS } from './limits.ts';
import { cutter } from './particulars.ts';
import { lines, words } from './words.ts';

/** Limits of a shop's cutter drawer. */
export const DRAWER_LIMITS = { cutters: 500, csvBytes: 1024 * 1024 } as const;

/** What a cutter's numbers must be among themselves; each by itself is held by the cutter's own contract. */
function checkShape(c: Cutter, wrong: (entry: string, takes: string) => void): void {
  if (c.maxPass !== undefined && c.maxPass > c.fluteLength)
    wrong('maxPass', `at most the flute length, ${c.fluteLength}`);
  if (c.kind === 'beading' && c.fluteLength < c.profileRadius)
    wrong('fluteLength', `at least the profile radius, ${c.profileRadius}`);
  if (c.kind === 'tapered' && c.fluteLength < c.tipRadius)
    wrong('fluteLength', `at least the tip radius, ${c.tipRadius}`);
}

const namedCutter = cutter.transform((c, ctx): DrawerEntry['cutter'] => {
  checkShape(c, (entry, takes) => ctx.addIssue({ code: 'custom', path: [entry], message: `takes ${takes}` }));
  if (c.name === undefined) ctx.addIssue({ code: 'custom', path: ['name'], message: 'takes some text' });
  return ctx.issues.length > 0 || c.name === undefined ? z.NEVER : { ...c, name: c.name };
});

/** A cutter as a person enters it into the drawer, without an id. Names are unique in a shop: the server's to hold. */
export const drawerEntry = z.strictObject({
  unit: z.enum(['in', 'mm'], { error: 'takes "in" or "mm"' }),
  cutter: namedCutter,
  remarks: lines(LIMITS.noteLength).default(''),
});
export type DrawerEntryInput = z.input<typeof drawerEntry>;

const ROLES = [
  'dado',
  'squaring',
  'opening',
  'perimeter',
  'bead',
  'quirk',
  'corner',
] as const satisfies readonly CutterRole[];

/** Which of the shop's cutters a draft's were picked from, by role. Kept beside the particulars, not in them. */
export const cutterRefs = z.partialRecord(z.enum(ROLES), words(100)) satisfies z.ZodType<CutterRefs>;

/** POST /api/cutters and PUT /api/cutters/:cutterId take a drawerEntry; PUT and DELETE answer cutterChanged. */
export const storedCutter = z.object({
  id: z.string(),
  unit: z.enum(['in', 'mm']),
  cutter: namedCutter,
  remarks: z.string(),
});
export type StoredCutter = z.output<typeof storedCutter>;

/** GET /api/cutters, by name. */
export const cutterList = z.object({ cutters: z.array(storedCutter) });
export type CutterList = z.output<typeof cutterList>;

/** What a change touched: drafts whose copy is now another one, to be looked at and refreshed. Null for a cutter taken out. */
export const cutterChanged = z.object({
  cutter: storedCutter.nullable(),
  changes: z.array(z.string()),
  drafts: z.array(
    z.object({ frameId: z.string(), frameName: z.string(), jobName: z.string(), roles: z.array(z.enum(ROLES)) }),
  ),
});
export type CutterChanged = z.output<typeof cutterChanged>;

/** A wrong cell of an uploaded file. */
export const csvProblem = z.object({
  line: z.number().int(),
  column: z.string(),
  got: z.string(),
  takes: z.string(),
  message: z.string(),
});

/** POST /api/cutters/csv?take=true */
export const csvQuery = z.strictObject({
  take: z.enum(['true', 'false'], { error: 'takes "true" or "false"' }).default('false'),
});

/** What a good row is to the drawer: a cutter that is not in it, one that is there with other numbers, or one as it is there. */
export const csvRow = z.object({
  line: z.number().int(),
  name: z.string(),
  is: z.enum(['new', 'changed', 'same']),
  /** Cells that differ from the drawer, as they would stand in a file; '' for nothing. */
  changes: z.array(z.object({ column: z.string(), was: z.string(), is: z.string() })),
});
export type CsvRow = z.output<typeof csvRow>;

/**
 * POST /api/cutters/csv (multipart, field `file`) says what each row is to the drawer and takes nothing; with `take=true`
 * the good rows are put in and changed, all or none. `added` and `changed` are what was done. GET /api/cutters/csv answers
 * the drawer as such a file.
 */
export const cuttersRead = z.object({
  rows: z.array(csvRow),
  problems: z.array(csvProblem),
  added: z.array(storedCutter),
  changed: z.array(z.object({ before: storedCutter, answer: cutterChanged })),
});
export type CuttersRead = z.output<typeof cuttersRead>;
