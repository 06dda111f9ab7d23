import type { DrawingPen } from './drawing-pen.ts';
import { drawn, refused, type Drawn } from './entity-plane.ts';
import type { EntityTags } from './entity-tags.ts';
import { FLAT, WHOLE_TURN } from './read-tolerances.ts';

const TURN = 2 * Math.PI;

/**
 * ELLIPSE: centre and major axis in the drawing's own coordinates; the minor axis is extrusion × major axis, shorter by
 * the ratio; parameters run from the major axis towards it (DXF Reference, ELLIPSE).
 */
export function drawEllipse(tags: EntityTags, pen: DrawingPen): Drawn {
  let x = NaN;
  let y = NaN;
  let z = 0;
  let ux = NaN;
  let uy = NaN;
  let uz = 0;
  let ratio = NaN;
  let from = 0;
  let to = TURN;
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
      case 11:
        ux = tags.number(i);
        break;
      case 21:
        uy = tags.number(i);
        break;
      case 31:
        uz = tags.number(i);
        break;
      case 40:
        ratio = tags.number(i);
        break;
      case 41:
        from = tags.number(i);
        break;
      case 42:
        to = tags.number(i);
        break;
    }
  tags.need(x, y, ux, uy, ratio);
  const face = tags.facing();
  if (tags.fault !== null) return refused(tags.fault.reason);
  const major = Math.hypot(ux, uy);
  if (!(ratio > 0) || !(major > 0)) return refused('bad-size');
  if (face === 'tilted' || Math.abs(uz) > FLAT * major) return refused('tilted');
  const side = face === 'up' ? ratio : -ratio;
  let sweep = to - from;
  if (Math.abs(sweep) >= TURN - WHOLE_TURN || Math.abs(sweep) <= WHOLE_TURN) sweep = TURN;
  else if (sweep < 0) sweep += TURN;
  pen.ellipse(x, y, ux, uy, -uy * side, ux * side, from, sweep);
  return drawn(z !== 0);
}
