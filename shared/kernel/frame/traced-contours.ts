import type { Finding } from '../checks/finding.ts';
import type { Contour, Point } from '../contour/contour.ts';
import { contourExtents } from '../contour/contour-extents.ts';
import { findCrossing } from '../contour/find-crossing.ts';
import { counterClockwise, dropRepeats } from '../contour/make-contour.ts';
import type { TracedOutline, TracedVertex } from '../particulars/particulars.ts';
import { placeContour } from '../placing/place.ts';
import type { SolvedFrame } from './members-contours.ts';
import type { Opening } from './members.ts';
import { openingLabel } from './opening-label.ts';

const read = (vertices: readonly TracedVertex[]): Contour =>
  dropRepeats({ closed: true, vertices: vertices.map(([x, y, bulge = 0]) => ({ x, y, bulge })) });

/** A contour needs three corners, or two joined by an arc, to have an inside. */
const hasInside = (c: Contour) =>
  c.vertices.length >= 3 || (c.vertices.length === 2 && c.vertices.some((v) => v.bulge !== 0));

const crossesItself = (what: string, field: string, id: string, at: Point): Finding => ({
  code: 'outline-crosses-itself',
  level: 'stop',
  text: `${what} crosses or touches itself.`,
  remedy: 'Mend the drawing at the marked place and trace it again.',
  numbers: { x: at.x, y: at.y },
  places: [{ face: 'both', features: [id], extents: { minX: at.x, minY: at.y, maxX: at.x, maxY: at.y } }],
  field,
});

/** A traced outline as lines, moved so that the perimeter's extents (arcs included) start at 0, 0. */
export function tracedContours(outline: TracedOutline): SolvedFrame {
  const findings: Finding[] = [];
  const raw = read(outline.perimeter);
  const box = contourExtents(raw.vertices.length > 0 ? raw : { closed: true, vertices: [{ x: 0, y: 0, bulge: 0 }] });
  const move = { sx: 1, sy: 1, dx: -box.minX, dy: -box.minY } as const;
  const normal = (contour: Contour) =>
    hasInside(contour) ? counterClockwise(placeContour(move, contour)) : placeContour(move, contour);

  const perimeter = normal(raw);
  const checkLine = (what: string, field: string, id: string, contour: Contour): boolean => {
    const first = contour.vertices[0] ?? { x: 0, y: 0 };
    const at = hasInside(contour) ? findCrossing(contour) : first;
    if (at) findings.push(crossesItself(what, field, id, at));
    return !at;
  };
  checkLine('The perimeter', 'outline.perimeter', 'perimeter', perimeter);

  const openings: Opening[] = [];
  outline.openings.forEach((vertices, i) => {
    const contour = normal(read(vertices));
    const label = openingLabel(i);
    if (!checkLine(`Opening ${label}`, `outline.openings.${i}`, `opening-${i}`, contour)) return;
    const extents = contourExtents(contour);
    openings.push({
      id: `opening-${i}`,
      label,
      contour,
      extents,
      width: extents.maxX - extents.minX,
      height: extents.maxY - extents.minY,
      arch: 0,
      square: outline.squareOpenings?.includes(i) ?? false,
    });
  });
  return {
    contours: { width: box.maxX - box.minX, height: box.maxY - box.minY, perimeter, openings, members: [] },
    findings,
  };
}
