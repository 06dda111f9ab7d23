import { containsPoint } from '#shared/kernel/contour/contains-point.ts';
import type { Extents, Point } from '#shared/kernel/contour/contour.ts';
import type { FeatureId } from '#shared/kernel/frame/members.ts';
import type { DrawnFrame } from '#shared/kernel/worked-frame.ts';

const holds = (e: Extents, p: Point, reach: number): boolean =>
  p.x >= e.minX - reach && p.x <= e.maxX + reach && p.y >= e.minY - reach && p.y <= e.maxY + reach;

/**
 * What lies at a place of frame view: dados first, then the opening or else the members there.
 * `reach` is how far beside a dado still counts, so that a narrow one can be pointed at.
 */
export function hitTest(worked: DrawnFrame, p: Point, reach: number): readonly FeatureId[] {
  const { contours, dados } = worked;
  const found: FeatureId[] = dados.filter((d) => holds(d.extents, p, reach)).map((d) => d.id);
  const opening = contours.openings.find((o) => holds(o.extents, p, 0) && containsPoint(o.contour, p));
  if (opening) return [...found, opening.id];
  return [...found, ...contours.members.filter((m) => holds(m.extents, p, 0)).map((m) => m.id)];
}
