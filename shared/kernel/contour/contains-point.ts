import type { Contour, Point } from './contour.ts';
import { segmentsOf, type ArcSegment } from './segments.ts';

/** Crossings of an arc by the ray from p to +X. The arc is cut where it runs level, so that each piece has one side of its centre. */
function arcCrossings(arc: ArcSegment, p: Point): number {
  const { centre, radius, start, sweep } = arc;
  const end = start + sweep;
  const low = Math.min(start, end);
  const high = Math.max(start, end);
  const cuts = [start];
  for (let k = Math.ceil((low - Math.PI / 2) / Math.PI); Math.PI / 2 + k * Math.PI < high; k++) {
    const cut = Math.PI / 2 + k * Math.PI;
    if (cut > low) cuts.push(cut);
  }
  cuts.push(end);
  cuts.sort((a, b) => (sweep > 0 ? a - b : b - a));
  const yAt = (i: number) =>
    i === 0 ? arc.a.y : i === cuts.length - 1 ? arc.b.y : centre.y + radius * Math.sin(cuts[i]!);
  let crossings = 0;
  for (let i = 1; i < cuts.length; i++) {
    if (yAt(i - 1) <= p.y === yAt(i) <= p.y) continue;
    const reach = Math.sqrt(Math.max(0, radius * radius - (p.y - centre.y) ** 2));
    const right = Math.cos((cuts[i - 1]! + cuts[i]!) / 2) > 0;
    if (centre.x + (right ? reach : -reach) > p.x) crossings++;
  }
  return crossings;
}

/** Whether a point lies inside a closed contour (even–odd rule). On the line itself the answer may be either. */
export function containsPoint(contour: Contour, p: Point): boolean {
  let crossings = 0;
  for (const s of segmentsOf(contour)) {
    if (s.kind === 'arc') crossings += arcCrossings(s, p);
    else if (s.a.y <= p.y !== s.b.y <= p.y && s.a.x + ((p.y - s.a.y) / (s.b.y - s.a.y)) * (s.b.x - s.a.x) > p.x)
      crossings++;
  }
  return crossings % 2 === 1;
}
