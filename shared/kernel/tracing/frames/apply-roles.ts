import type { Contour } from '../../contour/contour.ts';
import { contourExtents } from '../../contour/contour-extents.ts';
import { placeContour } from '../../placing/place.ts';
import type { TracedOutline } from '../../particulars/particulars.ts';
import type { Unit } from '../../units/unit.ts';
import { findParents } from './find-parents.ts';
import type { LoopRole, RoleLoop } from './loop-role.ts';
import { readDado, type TracedDado } from './read-dado.ts';
import { inReadingOrder } from './reading-order.ts';
import { tidyCoordinate } from './tidy-coordinate.ts';
import { tracedVertices } from './traced-vertices.ts';

export interface TracedFrames {
  /** In reading order of the drawing. */
  readonly frames: readonly TracedFrame[];
  readonly problems: readonly RoleProblem[];
}

/** A frame out of a drawing, frame view, its perimeter's extents from 0, 0. Loops are named by their places in the list they came in. */
export interface TracedFrame {
  readonly outline: TracedOutline;
  readonly width: number;
  readonly height: number;
  readonly perimeterLoop: number;
  /** In the order of `outline.openings`: top to bottom, left to right. */
  readonly openingLoops: readonly number[];
  readonly dados: readonly TracedDado[];
  readonly dadoLoops: readonly number[];
}

export interface RoleProblem {
  readonly code: 'no-perimeter' | 'in-no-perimeter' | 'perimeter-in-perimeter' | 'no-dado';
  readonly message: string;
  /** The loop it is about; null for the drawing as a whole. */
  readonly loop: number | null;
}

export interface FramesOptions {
  /** From which side the drawing looks at the frame; a back view is mirrored. Dados lie as they are drawn: in the front view, unless this says otherwise. */
  readonly view?: 'front' | 'back';
}

const MESSAGES: Record<RoleProblem['code'], string> = {
  'no-perimeter': 'No loop is a perimeter: say which is the outer line of a frame.',
  'in-no-perimeter': 'This loop lies inside no perimeter and was left out.',
  'perimeter-in-perimeter': 'This perimeter lies inside another one: a frame holds openings, not frames.',
  'no-dado': 'A dado has to be an upright rectangle; this loop was left out.',
};

/**
 * Frames from loops whose roles are said, one role a loop. An opening or dado belongs to the smallest perimeter that holds it.
 * What fits nowhere is left out and comes back as a problem. Throws when there are not as many roles as loops.
 */
export function applyRoles(
  loops: readonly RoleLoop[],
  roles: readonly LoopRole[],
  unit: Unit,
  { view = 'front' }: FramesOptions = {},
): TracedFrames {
  if (roles.length !== loops.length) throw new RangeError(`roles: got ${roles.length}, takes ${loops.length}`);
  const mirror = { sx: view === 'back' ? -1 : 1, sy: 1, dx: 0, dy: 0 } as const;
  const contours = loops.map(({ contour }) => placeContour(mirror, contour));
  const problems: RoleProblem[] = [];
  const say = (code: RoleProblem['code'], loop: number | null) =>
    problems.push({ code, message: MESSAGES[code], loop });

  const held = new Map<number, { openings: number[]; dados: number[] }>();
  roles.forEach((role, i) => {
    if (role === 'perimeter') held.set(i, { openings: [], dados: [] });
  });
  if (held.size === 0 && loops.length > 0) say('no-perimeter', null);
  const used = loops.flatMap((_, i) => (roles[i] === 'leave-out' ? [] : [i]));
  const parents = findParents(
    used.map((i) => contours[i]!),
    (at) => roles[used[at]!] === 'perimeter',
  );
  used.forEach((i, at) => {
    const holder = parents[at]! < 0 ? undefined : used[parents[at]!];
    if (roles[i] === 'perimeter') {
      if (holder !== undefined) say('perimeter-in-perimeter', i);
    } else if (holder === undefined) say('in-no-perimeter', i);
    else if (roles[i] === 'opening') held.get(holder)!.openings.push(i);
    else if (readDado(contours[i]!, unit)) held.get(holder)!.dados.push(i);
    else say('no-dado', i);
  });
  const frames = [...held].map(([i, { openings, dados }]) => makeFrame(contours, i, openings, dados, unit));
  return { frames: inReadingOrder(frames, (frame) => contourExtents(contours[frame.perimeterLoop]!), unit), problems };
}

function makeFrame(
  contours: readonly Contour[],
  perimeter: number,
  openings: readonly number[],
  dados: readonly number[],
  unit: Unit,
): TracedFrame {
  const box = contourExtents(contours[perimeter]!);
  const move = { sx: 1, sy: 1, dx: -box.minX, dy: -box.minY } as const;
  const moved = (i: number) => placeContour(move, contours[i]!);
  const ordered = inReadingOrder(openings, (i) => contourExtents(contours[i]!), unit);
  const outline: TracedOutline = {
    kind: 'traced',
    perimeter: tracedVertices(moved(perimeter)),
    openings: ordered.map((i) => tracedVertices(moved(i))),
  };
  const dadoOf = (i: number) => readDado(moved(i), unit);
  return {
    outline,
    width: tidyCoordinate(box.maxX - box.minX),
    height: tidyCoordinate(box.maxY - box.minY),
    perimeterLoop: perimeter,
    openingLoops: ordered,
    dados: dados.flatMap((i) => dadoOf(i) ?? []),
    dadoLoops: dados,
  };
}
