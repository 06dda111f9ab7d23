import type { Contour } from '#shared/kernel/contour/contour.ts';
import { svgPath } from '#shared/kernel/contour/svg-path.ts';
import { contourOfVertices } from '#shared/kernel/tracing/contour-of-vertices.ts';
import type { LoopRole } from '#shared/kernel/tracing/frames/loop-role.ts';
import type { TracedDrawing } from '#shared/kernel/tracing/traced-drawing.ts';
import type { DrawnLoop } from '../model/loop-contours.ts';

const NUMBERS_A_SEGMENT = 5;

const join = (contours: readonly Contour[]): string => contours.map(svgPath).join('');

/** All lines and arcs as found, as one path in drawing units; '' when there were too many to send. */
export function foundPath(found: TracedDrawing['found']): string {
  if (found === null) return '';
  let path = '';
  for (let i = 0; i < found.length; i += NUMBERS_A_SEGMENT) {
    const [ax, ay, bx, by, bulge] = found.slice(i, i + NUMBERS_A_SEGMENT) as [number, number, number, number, number];
    path += svgPath({
      closed: false,
      vertices: [
        { x: ax, y: ay, bulge },
        { x: bx, y: by, bulge: 0 },
      ],
    });
  }
  return path;
}

/** All loops of a role as one path: one element a role keeps thousands of loops quick to move. */
export const rolePath = (loops: readonly DrawnLoop[], roles: readonly LoopRole[], role: LoopRole): string =>
  join(loops.flatMap(({ contour }, i) => (roles[i] === role ? [contour] : [])));

export const chosenPath = (loops: readonly DrawnLoop[], chosen: Iterable<number>): string =>
  join([...chosen].flatMap((i) => loops[i]?.contour ?? []));

/** What does not close, as one path. */
export const openPath = (open: TracedDrawing['open']): string =>
  join(open.map((vertices) => contourOfVertices(vertices, false)));
