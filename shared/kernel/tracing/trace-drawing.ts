import type { Contour } from '../contour/contour.ts';
import type { TracedVertex } from '../particulars/particulars.ts';
import { contourOfVertices } from './contour-of-vertices.ts';
import type { FoundCurves, FoundDrawing } from './found-drawing.ts';
import { foundExtents } from './found-extents.ts';
import { guessRoles } from './frames/guess-roles.ts';
import type { RoleNote } from './frames/loop-role.ts';
import { tracedVertices } from './frames/traced-vertices.ts';
import { healCurves } from './heal/heal-curves.ts';
import type { HealedDrawing } from './heal/healed-drawing.ts';
import { NotTraceable } from './not-traceable.ts';
import { DrawingTooBig } from './read/drawing-too-big.ts';
import { readDrawing } from './read/read-drawing.ts';
import { unitChord } from './read/read-tolerances.ts';
import { sniffFile } from './read/sniff-file.ts';
import type { TracedDrawing, TracedLoop, TraceOptions, TraceProblem } from './traced-drawing.ts';

/** More lines than this are not sent to be drawn as found; what they healed to is. */
const MOST_DRAWN = 60_000;
const NUMBERS_A_SEGMENT = 5;

/** The file as lines and arcs. Throws NotTraceable for what is no DXF, and beyond the limits. */
export function readFound(bytes: Uint8Array, { unit, include, leaveOut }: TraceOptions): FoundDrawing {
  const other = sniffFile(bytes);
  if (other) throw new NotTraceable(other.code, other.message);
  try {
    return readDrawing(bytes, { include, leaveOut, ...(unit === null ? {} : { chordTolerance: unitChord(unit) }) });
  } catch (error) {
    if (error instanceof DrawingTooBig) throw new NotTraceable(error.code, error.message);
    throw error;
  }
}

/** Closed loops out of found lines, in the chosen unit. */
export const healFound = (
  curves: FoundCurves,
  unit: HealedDrawing['unit'],
  { gap, arcs }: TraceOptions,
): HealedDrawing => healCurves(curves, { unit, gap, ...(arcs === null ? {} : { arcsFromLines: { tolerance: arcs } }) });

const NOTES: Record<RoleNote, string> = {
  'inside-an-opening': 'A loop inside an opening is left out: say what it is if it belongs to the frame.',
  'touches-the-outline': 'A loop along the perimeter’s edge is taken for a member and left out.',
  'only-round-cells':
    'The line round several loops that touch is left out: each of them is taken for a frame of its own.',
};

/** Numbers to draw, about `origin`, at a fineness far below what a screen shows. */
function drawable({ count, segments }: FoundCurves, x: number, y: number): number[] | null {
  if (count > MOST_DRAWN) return null;
  const out: number[] = [];
  for (let i = 0; i < count * NUMBERS_A_SEGMENT; i += NUMBERS_A_SEGMENT) {
    out.push(segments[i]! - x, segments[i + 1]! - y, segments[i + 2]! - x, segments[i + 3]! - y, segments[i + 4]!);
  }
  return out;
}

const vertices = (contour: Contour): TracedVertex[] => tracedVertices(contour);

/**
 * Somebody's drawing as found and as healed, with a role for each loop. Without a unit, in the file or chosen, nothing is healed:
 * a gap that is closed is so many millimetres. Throws NotTraceable for a file that is no DXF or beyond the limits.
 */
export function traceDrawing(bytes: Uint8Array, options: TraceOptions): TracedDrawing {
  const found = readFound(bytes, options);
  const unit = options.unit ?? found.unit;
  const extents = foundExtents(found.curves);
  const common = {
    fileUnit: found.unit,
    unit,
    incomplete: found.incomplete,
    census: found.census,
    placed: found.placed,
    segments: found.curves.count,
  };
  if (unit === null) {
    const origin = [extents?.minX ?? 0, extents?.minY ?? 0] as const;
    return {
      ...common,
      origin,
      extents: extents && moved(extents, ...origin),
      problems: found.problems.map((problem) => placed(problem, ...origin)),
      found: drawable(found.curves, ...origin),
      loops: [],
      open: [],
      counts: null,
    };
  }
  const healed = healFound(found.curves, unit, options);
  const { x, y } = healed.origin;
  const roles = guessRoles(healed.loops);
  const loops = healed.loops.map(({ contour, kind }, i): TracedLoop => ({
    vertices: vertices(contour),
    kind,
    role: roles[i]!.role,
  }));
  const notes = roles.flatMap(({ note }, i): TraceProblem[] => {
    if (note === null) return [];
    const [first] = contourOfVertices(loops[i]!.vertices).vertices;
    return [{ code: note, message: NOTES[note], at: [first!.x, first!.y] }];
  });
  return {
    ...common,
    origin: [x, y],
    extents: extents && moved(extents, x, y),
    problems: [
      ...found.problems.map((problem) => placed(problem, x, y)),
      ...healed.problems.map(({ code, message, at }): TraceProblem => ({ code, message, at })),
      ...notes,
    ],
    found: drawable(found.curves, x, y),
    loops,
    open: healed.open.map(vertices),
    counts: healed.counts,
  };
}

const moved = (e: NonNullable<TracedDrawing['extents']>, x: number, y: number): TracedDrawing['extents'] => ({
  minX: e.minX - x,
  minY: e.minY - y,
  maxX: e.maxX - x,
  maxY: e.maxY - y,
});

const placed = ({ at, ...problem }: FoundDrawing['problems'][number], x: number, y: number): TraceProblem =>
  at ? { ...problem, at: [at[0] - x, at[1] - y] } : problem;
