import type { Contour } from '../contour/contour.ts';
import { polygon, rectangle } from '../contour/make-contour.ts';
import type { Particulars } from '../particulars/particulars.ts';
import type { BlankPlan } from './blank-plan.ts';
import { placeExtents } from './place.ts';

/**
 * The squaring line in the back setup. Two edges: an open line through the squared corner, run past the rough edges by the
 * cutter's radius, with the waste at the right of its direction. All edges: the closed rectangle (W + 2k) × (H + 2k) about
 * the frame, counter-clockwise, waste outside.
 */
export function squaringLine(
  plan: BlankPlan,
  width: number,
  height: number,
  setup: Particulars['setup'],
  radius: number,
): Contour {
  const k = setup.allowance;
  if (setup.squaring === 'all-edges')
    return rectangle(placeExtents(plan.back, { minX: -k, minY: -k, maxX: width + k, maxY: height + k }));
  const { x, y } = plan.squaredCorner;
  const { maxX, maxY } = plan.rough;
  const points =
    plan.flip === 'side-to-side'
      ? [
          { x: -radius, y },
          { x, y },
          { x, y: maxY + radius },
        ]
      : [
          { x: maxX + radius, y },
          { x, y },
          { x, y: -radius },
        ];
  return { ...polygon(points), closed: false };
}
