import type { DrawingPen } from './drawing-pen.ts';
import { drawn, refused, type Drawn } from './entity-plane.ts';
import type { EntityTags } from './entity-tags.ts';
import { FLAT } from './read-tolerances.ts';

/** LINE: both ends are in the drawing's own coordinates, whatever the extrusion (DXF Reference, LINE). */
export function drawLine(tags: EntityTags, pen: DrawingPen): Drawn {
  let x0 = NaN;
  let y0 = NaN;
  let z0 = 0;
  let x1 = NaN;
  let y1 = NaN;
  let z1 = 0;
  for (let i = 0; i < tags.count; i++)
    switch (tags.codes[i]!) {
      case 10:
        x0 = tags.number(i);
        break;
      case 20:
        y0 = tags.number(i);
        break;
      case 30:
        z0 = tags.number(i);
        break;
      case 11:
        x1 = tags.number(i);
        break;
      case 21:
        y1 = tags.number(i);
        break;
      case 31:
        z1 = tags.number(i);
        break;
    }
  tags.need(x0, y0, x1, y1);
  if (tags.fault !== null) return refused(tags.fault.reason);
  if (Math.abs(z1 - z0) > FLAT * Math.max(1, Math.abs(x0), Math.abs(y0), Math.abs(z0))) return refused('not-flat');
  pen.line(x0, y0, x1, y1);
  return drawn(z0 !== 0);
}
