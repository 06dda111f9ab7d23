import { LEAST_CHORD_ANGLE } from '../tolerances.ts';
import type { Contour, Point } from './contour.ts';
import { segmentsOf, type ArcSegment } from './segments.ts';

/** The point of an arc at a share of its sweep, 0 to 1. */
export function pointOnArc(arc: ArcSegment, share: number): Point {
  const angle = arc.start + arc.sweep * share;
  return { x: arc.centre.x + arc.radius * Math.cos(angle), y: arc.centre.y + arc.radius * Math.sin(angle) };
}

/** Points along a contour, arcs as chords nowhere further than `chord` from the arc. A closed contour's first point is not repeated. */
export function flattenContour(contour: Contour, chord: number): Point[] {
  if (!(chord > 0)) throw new RangeError(`chord tolerance: got ${chord}, takes a length above 0`);
  const out: Point[] = [];
  for (const segment of segmentsOf(contour)) {
    out.push(segment.a);
    if (segment.kind === 'line') continue;
    // Sagitta of a chord over angle θ: R(1 − cos θ/2).
    const step = 2 * Math.acos(Math.max(-1, 1 - chord / segment.radius));
    const pieces = Math.max(1, Math.ceil(Math.abs(segment.sweep) / Math.max(step, LEAST_CHORD_ANGLE)));
    for (let i = 1; i < pieces; i++) out.push(pointOnArc(segment, i / pieces));
  }
  if (!contour.closed && contour.vertices.length > 0) out.push(contour.vertices[contour.vertices.length - 1]!);
  return out;
}
