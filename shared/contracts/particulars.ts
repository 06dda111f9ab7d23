import { z } from 'zod';
import type { Cutter } from '../kernel/cutters/cutter.ts';
import type { LayoutPart, Particulars } from '../kernel/particulars/particulars.ts';
import { LIMITS } from './limits.ts';
import { words } from './words.ts';

/** Longest length that a frame file takes, in either unit. */
const LONGEST = 10_000;

const takes = (text: string) => ({ error: `takes ${text}` });

/** A length above 0. */
const length = z
  .number(takes('a length above 0'))
  .gt(0, takes('a length above 0'))
  .max(LONGEST, takes(`a length up to ${LONGEST}`));
/** A length that may be 0. */
const lengthOrNone = z
  .number(takes('a length, 0 or more'))
  .min(0, takes('a length, 0 or more'))
  .max(LONGEST, takes(`a length up to ${LONGEST}`));
/** A place in frame view; may lie outside the frame. */
const place = z
  .number(takes('a place in frame view'))
  .min(-LONGEST, takes(`a place from -${LONGEST}`))
  .max(LONGEST, takes(`a place up to ${LONGEST}`));

const cutterCommon = {
  fluteLength: length,
  maxPass: length.optional(),
  name: words(LIMITS.nameLength).optional(),
  number: z
    .number(takes('a whole number from 0 to 9999'))
    .int(takes('a whole number from 0 to 9999'))
    .min(0, takes('a whole number from 0 to 9999'))
    .max(9999, takes('a whole number from 0 to 9999'))
    .optional(),
};

export const cutter = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('straight'), diameter: length, ...cutterCommon }),
  z.strictObject({
    kind: z.literal('vee'),
    includedAngle: z
      .number(takes('an included angle in degrees, 5 to 170'))
      .min(5, takes('an included angle in degrees, 5 to 170'))
      .max(170, takes('an included angle in degrees, 5 to 170')),
    ...cutterCommon,
  }),
  z.strictObject({
    kind: z.literal('tapered'),
    tipRadius: length,
    sideAngle: z
      .number(takes('the angle of one side in degrees, above 0, up to 45'))
      .gt(0, takes('the angle of one side in degrees, above 0, up to 45'))
      .max(45, takes('the angle of one side in degrees, above 0, up to 45')),
    ...cutterCommon,
  }),
  z.strictObject({ kind: z.literal('beading'), profileRadius: length, tipFlat: lengthOrNone, ...cutterCommon }),
]) satisfies z.ZodType<Cutter>;

const openingPart = z.strictObject({
  opening: z.strictObject({
    label: words(LIMITS.labelLength).optional(),
    arch: lengthOrNone.optional(),
    edge: z.literal('square', takes('"square", or nothing')).optional(),
  }),
  size: length.optional(),
});
const columnsPart = z.strictObject({
  columns: z.array(z.unknown()).min(1, takes('at least one part')),
  between: length,
  size: length.optional(),
});
const rowsPart = z.strictObject({
  rows: z.array(z.unknown()).min(1, takes('at least one part')),
  between: length,
  size: length.optional(),
});

const DEEPEST_TREE = 12;

/** Reads one part of the layout tree by the key that it has, so that a mistake is named where it stands. */
function readPart(
  value: unknown,
  path: PropertyKey[],
  depth: number,
  problem: (path: PropertyKey[], issue: z.core.$ZodIssue | string) => void,
): LayoutPart | null {
  if (depth > DEEPEST_TREE) return (problem(path, `takes a tree at most ${DEEPEST_TREE} parts deep`), null);
  const has = (key: string) => value !== null && typeof value === 'object' && key in value;
  const kinds = ['opening', 'columns', 'rows'].filter(has);
  if (kinds.length !== 1) return (problem(path, 'takes one of "opening", "columns" or "rows"'), null);
  const schema = kinds[0] === 'opening' ? openingPart : kinds[0] === 'columns' ? columnsPart : rowsPart;
  const read = schema.safeParse(value);
  if (!read.success) {
    for (const issue of read.error.issues) problem([...path, ...issue.path], issue);
    return null;
  }
  const part = read.data;
  if ('opening' in part) return part;
  const key = 'columns' in part ? 'columns' : 'rows';
  const list = 'columns' in part ? part.columns : part.rows;
  const children = list.map((child, i) => readPart(child, [...path, key, i], depth + 1, problem));
  return children.every((c) => c !== null) ? ({ ...part, [key]: children } as LayoutPart) : null;
}

const countOpenings = (part: LayoutPart): number =>
  'opening' in part ? 1 : ('columns' in part ? part.columns : part.rows).reduce((n, p) => n + countOpenings(p), 0);

const layout = z.unknown().transform((value, ctx): LayoutPart => {
  const part = readPart(value, [], 0, (path, issue) =>
    ctx.addIssue(
      typeof issue === 'string'
        ? { code: 'custom', path, message: issue }
        : ({ ...issue, path } as z.core.$ZodRawIssue),
    ),
  );
  if (part === null) return z.NEVER;
  if (part.size !== undefined) {
    ctx.addIssue({ code: 'custom', path: ['size'], message: 'takes no size here: the outermost part fills the frame' });
    return z.NEVER;
  }
  if (countOpenings(part) > LIMITS.openings) {
    ctx.addIssue({ code: 'custom', message: `takes at most ${LIMITS.openings} openings` });
    return z.NEVER;
  }
  return part;
});

const bulge = z.number(takes('a bulge')).min(-1e6, takes('a bulge')).max(1e6, takes('a bulge'));
const tracedVertex = z.union(
  [z.tuple([place, place]), z.tuple([place, place, bulge])],
  takes('[x, y] or [x, y, bulge]'),
);
const tracedContour = z
  .array(tracedVertex, takes('a list of [x, y] or [x, y, bulge]'))
  .min(2, takes('at least two vertices'))
  .max(LIMITS.tracedVertices, takes(`at most ${LIMITS.tracedVertices} vertices`));

const outline = z.discriminatedUnion('kind', [
  z.strictObject({
    kind: z.literal('members'),
    width: length,
    height: length,
    stiles: z.strictObject({ left: length, right: length }),
    rails: z.strictObject({ top: length, bottom: length }),
    feet: lengthOrNone,
    layout,
  }),
  z.strictObject({
    kind: z.literal('traced'),
    perimeter: tracedContour,
    openings: z
      .array(tracedContour, takes('a list of contours'))
      .max(LIMITS.openings, takes(`at most ${LIMITS.openings} openings`)),
    squareOpenings: z
      .array(
        z
          .number(takes('a place in the list of openings, from 0'))
          .int(takes('a place in the list of openings, from 0'))
          .min(0, takes('a place in the list of openings, from 0')),
        takes('a list of places in the list of openings'),
      )
      .max(LIMITS.openings, takes(`at most ${LIMITS.openings} openings`))
      .optional(),
  }),
]);

const corners = z.enum(['lift', 'vee', 'round'], takes('"lift", "vee" or "round"')).optional();

export const edge = z.discriminatedUnion('style', [
  z.strictObject({
    style: z.literal('square'),
    sizeHeldAt: z.enum(['face', 'back'], takes('"face" or "back"')),
    corners,
  }),
  z.strictObject({
    style: z.literal('beaded'),
    sizeHeldAt: z.enum(['face', 'back', 'bead base'], takes('"face", "back" or "bead base"')).optional(),
    bead: z.strictObject({ radius: length, drop: lengthOrNone, quirk: length }),
    corners,
  }),
]);

const dadoEnd = z.enum(['open', 'stopped', 'meets'], takes('"open", "stopped" or "meets"'));

const dado = z
  .strictObject({
    part: words(LIMITS.labelLength),
    runs: z.enum(['vertical', 'horizontal'], takes('"vertical" or "horizontal"')),
    at: place,
    panel: length,
    clearance: lengthOrNone,
    depth: length,
    from: place,
    to: place,
    ends: z.tuple([dadoEnd, dadoEnd], takes('two ends, each "open", "stopped" or "meets"')),
  })
  .refine((d) => d.to > d.from, { path: ['to'], error: 'takes a place beyond "from"' });

/** A frame's particulars, as in a frame file. Unknown keys are refused by name. Geometry is checked by the kernel. */
export const particulars = z.strictObject({
  format: z.literal('stilepost.frame/1', takes('"stilepost.frame/1"')),
  name: words(LIMITS.nameLength),
  unit: z.enum(['in', 'mm'], takes('"in" or "mm"')),
  thickness: length,
  outline,
  edge,
  dados: z.array(dado, takes('a list of dados')).max(LIMITS.dados, takes(`at most ${LIMITS.dados} dados`)),
  setup: z.strictObject({
    flip: z.enum(['side-to-side', 'end-over-end'], takes('"side-to-side" or "end-over-end"')),
    allowance: length,
    trim: length,
    squaring: z.enum(['two-edges', 'all-edges'], takes('"two-edges" or "all-edges"')),
    spoilboard: lengthOrNone,
  }),
  cutters: z.strictObject({
    dado: cutter,
    squaring: cutter,
    opening: cutter,
    perimeter: cutter,
    bead: cutter.optional(),
    quirk: cutter.optional(),
    corner: cutter.optional(),
  }),
  blank: z.strictObject({ width: length, height: length }).optional(),
});

// The kernel's type is the wider one (it knows beaded edges); what this reads must fit it.
const _fits: (p: z.output<typeof particulars>) => Particulars = (p) => p;
void _fits;
