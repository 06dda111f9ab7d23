import type { DrawingPen } from './drawing-pen.ts';
import { refused, type Drawn } from './entity-plane.ts';
import type { RefusedReason } from './entity-reasons.ts';
import type { EntityTags } from './entity-tags.ts';
import { FLAT } from './read-tolerances.ts';
import type { TagReader } from './tag-reader.ts';
import type { VertexRow } from './vertex-row.ts';

/** Flags of POLYLINE and VERTEX (DXF Reference, group 70 of both). */
const CLOSED = 1;
const IN_SPACE = 8;
const MESH = 16 | 64;
const SPLINE_FRAME = 16;

/**
 * POLYLINE with the VERTEX records behind it, which are read to their end in any case: up to SEQEND or whatever else
 * comes. All have to lie at one height. A polyline in space keeps the drawing's own coordinates; a flat one has bulges
 * and the coordinates of its extrusion. Control points that a spline-fit polyline carries along are not its vertices.
 */
export function drawPolyline(
  reader: TagReader,
  tags: EntityTags,
  vertexTags: EntityTags,
  pen: DrawingPen,
  row: VertexRow,
): Drawn & { readonly hasEnd: boolean } {
  let flags = 0;
  let height = 0;
  let wide = false;
  for (let i = 0; i < tags.count; i++)
    switch (tags.codes[i]!) {
      case 70:
        flags = tags.whole(i);
        break;
      case 30:
        height = tags.number(i);
        break;
      case 40:
      case 41:
        wide = tags.number(i) !== 0 || wide;
        break;
    }
  const inSpace = (flags & IN_SPACE) !== 0;
  const facing = tags.facing();
  const vertices = readVertices(reader, tags, vertexTags, row);
  const hasEnd = reader.code === 0 && reader.is('SEQEND');
  if (hasEnd) vertexTags.collect(reader);
  const refuse = (reason: RefusedReason) => ({ ...refused(reason), hasEnd });
  if ((flags & MESH) !== 0) return refuse('three-dimensional');
  if (tags.fault !== null) return refuse(tags.fault.reason);
  if (!hasEnd && reader.code !== 0) return refuse('cut-off');
  const face = inSpace ? 'up' : facing;
  if (face === 'tilted') return refuse('tilted');
  if (!vertices.flat) return refuse('not-flat');
  if (face === 'down') pen.turnOver();
  if (inSpace) row.bulges.fill(0, 0, row.count);
  row.draw(pen, (flags & CLOSED) !== 0);
  const lifted = height !== 0 || vertices.height !== 0;
  return { refused: null, lifted, wide: wide || vertices.wide, hasEnd };
}

/** Reads the vertices that follow into the row; their first fault becomes the polyline's. */
function readVertices(reader: TagReader, tags: EntityTags, vertexTags: EntityTags, row: VertexRow) {
  row.clear();
  let lowest = Infinity;
  let highest = -Infinity;
  let far = 1;
  let wide = false;
  while (reader.code === 0 && reader.is('VERTEX')) {
    vertexTags.collect(reader);
    let x = NaN;
    let y = NaN;
    let z = 0;
    let bulge = 0;
    let flags = 0;
    for (let i = 0; i < vertexTags.count; i++)
      switch (vertexTags.codes[i]!) {
        case 10:
          x = vertexTags.number(i);
          break;
        case 20:
          y = vertexTags.number(i);
          break;
        case 30:
          z = vertexTags.number(i);
          break;
        case 40:
        case 41:
          wide = vertexTags.number(i) !== 0 || wide;
          break;
        case 42:
          bulge = vertexTags.number(i);
          break;
        case 70:
          flags = vertexTags.whole(i);
          break;
      }
    vertexTags.need(x, y);
    if (vertexTags.fault !== null) {
      tags.fault ??= vertexTags.fault;
      continue;
    }
    if ((flags & SPLINE_FRAME) !== 0) continue;
    row.add(x, y, bulge);
    lowest = Math.min(lowest, z);
    highest = Math.max(highest, z);
    far = Math.max(far, Math.abs(x), Math.abs(y), Math.abs(z));
  }
  return { flat: row.count === 0 || highest - lowest <= FLAT * far, height: row.count === 0 ? 0 : lowest, wide };
}
