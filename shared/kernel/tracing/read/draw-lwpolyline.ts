import type { DrawingPen } from './drawing-pen.ts';
import { refused, type Drawn } from './entity-plane.ts';
import type { EntityTags } from './entity-tags.ts';
import type { VertexRow } from './vertex-row.ts';

const CLOSED = 1;

/**
 * LWPOLYLINE: each group 10 begins a vertex, to which the groups 20, 42 (bulge) and 40, 41 (widths), 91 (its number)
 * behind it belong; 43 is a width of all, 38 the height (DXF Reference, LWPOLYLINE). Group 90, the count of vertices, is
 * believed only where the file ends within the polyline.
 */
export function drawLwpolyline(tags: EntityTags, pen: DrawingPen, row: VertexRow): Drawn {
  row.clear();
  let x = NaN;
  let y = NaN;
  let bulge = 0;
  let begun = false;
  let flags = 0;
  let height = 0;
  let told = 0;
  let wide = false;
  for (let i = 0; i < tags.count; i++)
    switch (tags.codes[i]!) {
      case 10:
        if (begun) {
          tags.need(x, y);
          row.add(x, y, bulge);
        }
        begun = true;
        x = tags.number(i);
        y = NaN;
        bulge = 0;
        break;
      case 20:
        y = tags.number(i);
        break;
      case 42:
        bulge = tags.number(i);
        break;
      case 40:
      case 41:
      case 43:
        wide = tags.number(i) !== 0 || wide;
        break;
      case 70:
        flags = tags.whole(i);
        break;
      case 38:
        height = tags.number(i);
        break;
      case 90:
        told = tags.cut ? tags.whole(i) : 0;
        break;
    }
  tags.need(x, y);
  const face = tags.facing();
  if (tags.fault !== null) return refused(tags.fault.reason);
  row.add(x, y, bulge);
  if (tags.cut && row.count < told) return refused('cut-off');
  if (face === 'tilted') return refused('tilted');
  if (face === 'down') pen.turnOver();
  row.draw(pen, (flags & CLOSED) !== 0);
  return { refused: null, lifted: height !== 0, wide };
}
