import type { DrawingPen } from './drawing-pen.ts';
import { drawn, refused, type Drawn } from './entity-plane.ts';
import type { EntityTags } from './entity-tags.ts';

/**
 * ARC and CIRCLE, in the coordinates of their extrusion; angles in degrees, counter-clockwise seen against it (DXF
 * Reference, ARC, CIRCLE). An arc whose angles are the same goes all round.
 */
export function drawArc(tags: EntityTags, pen: DrawingPen, isCircle: boolean): Drawn {
  let x = NaN;
  let y = NaN;
  let z = 0;
  let radius = NaN;
  let from = isCircle ? 0 : NaN;
  let to = isCircle ? 360 : NaN;
  for (let i = 0; i < tags.count; i++)
    switch (tags.codes[i]!) {
      case 10:
        x = tags.number(i);
        break;
      case 20:
        y = tags.number(i);
        break;
      case 30:
        z = tags.number(i);
        break;
      case 40:
        radius = tags.number(i);
        break;
      case 50:
        if (!isCircle) from = tags.number(i);
        break;
      case 51:
        if (!isCircle) to = tags.number(i);
        break;
    }
  tags.need(x, y, radius, from, to);
  const face = tags.facing();
  if (tags.fault !== null) return refused(tags.fault.reason);
  if (!(radius > 0)) return refused('bad-size');
  if (face === 'tilted') return refused('tilted');
  if (face === 'down') pen.turnOver();
  pen.arc(x, y, radius, from, to);
  return drawn(z !== 0);
}
