import type { Point } from '../contour/contour.ts';
import type { Segment } from '../contour/segments.ts';

/** Squared distance from a point to a line or arc, its ends included. */
export function squareToSegment(s: Segment, { x, y }: Point): number {
  if (s.kind === 'line') {
    const dx = s.b.x - s.a.x;
    const dy = s.b.y - s.a.y;
    const length = dx * dx + dy * dy;
    const along = length === 0 ? 0 : ((x - s.a.x) * dx + (y - s.a.y) * dy) / length;
    const t = along < 0 ? 0 : along > 1 ? 1 : along;
    return (x - s.a.x - t * dx) ** 2 + (y - s.a.y - t * dy) ** 2;
  }
  return withinSweep(s, x, y) ? (Math.hypot(x - s.centre.x, y - s.centre.y) - s.radius) ** 2 : toEnds(s, x, y);
}

const toEnds = ({ a, b }: Segment, x: number, y: number): number =>
  Math.min((x - a.x) ** 2 + (y - a.y) ** 2, (x - b.x) ** 2 + (y - b.y) ** 2);

/** Whether an arc's centre looks across the arc at a point. */
export function withinSweep({ centre, a, b, sweep }: Extract<Segment, { kind: 'arc' }>, x: number, y: number): boolean {
  const [begin, finish] = sweep > 0 ? [a, b] : [b, a];
  const afterBegin = (begin.x - centre.x) * (y - centre.y) - (begin.y - centre.y) * (x - centre.x) >= 0;
  const beforeFinish = (x - centre.x) * (finish.y - centre.y) - (y - centre.y) * (finish.x - centre.x) >= 0;
  return Math.abs(sweep) > Math.PI ? afterBegin || beforeFinish : afterBegin && beforeFinish;
}
