import { contourExtents, joinExtents, pointExtents } from '../contour/contour-extents.ts';
import type { Extents, Point } from '../contour/contour.ts';
import { lineSetKey, type Face, type Shape } from '../line-sets/line-set.ts';
import { placeExtents } from '../placing/place.ts';
import { carriedLineSets } from '../profiles/carried-line-sets.ts';
import type { FileProfile } from '../profiles/file-profile.ts';
import { fileUnit } from '../profiles/file-unit.ts';
import { labelsKey, nameLayers } from '../profiles/name-layers.ts';
import { convertLength } from '../units/convert-length.ts';
import type { DrawnFrame } from '../worked-frame.ts';
import type { Drawing, DrawingEntity, DrawingLayer } from './drawing.ts';
import { DrawingRefused } from './drawing-refused.ts';
import { placeLabels } from './place-labels.ts';
import { tidyContour, tidyPath } from './tidy-line.ts';

/**
 * Where 0, 0 of the file lies in the face's setup, in the frame's unit. 'pins' is the setup's own origin. 'frame' is
 * the lower left corner of the finished frame as it lies in that setup: in the back setup, where the board is seen
 * from behind, that corner is frame view's lower right one (side to side) or upper left one (end over end).
 */
function originOf(worked: DrawnFrame, face: Face, origin: FileProfile['origin']): Point {
  if (origin === 'pins') return { x: 0, y: 0 };
  const { width, height } = worked.contours;
  const lies = placeExtents(worked[face].placement, { minX: 0, minY: 0, maxX: width, maxY: height });
  return { x: lies.minX, y: lies.minY };
}

function entityExtents(entity: DrawingEntity): Extents | undefined {
  if (entity.kind === 'polyline') return contourExtents(entity);
  return entity.kind === 'polyline3d' ? pointExtents(entity.points) : undefined;
}

/**
 * One face as a neutral drawing in the profile's unit, decimals and origin: its line sets in cutting order, each on
 * its layer, then labels when the profile wants them. Layers without lines are left out. Conversion from inches to
 * millimetres or back happens here and nowhere else. Extents are those of the lines, crowns of arcs included;
 * text is not counted. Throws DrawingRefused when two line sets would share a layer, for a line that shrinks to
 * nothing at the profile's decimals, and for a face without any line.
 */
export function buildDrawing(worked: DrawnFrame, face: Face, profile: FileProfile): Drawing {
  const drawn = worked.particulars.unit;
  const unit = fileUnit(profile, drawn);
  const { decimals } = profile;
  const named = nameLayers(worked, profile);
  const origin = originOf(worked, face, profile.origin);
  const length = (value: number) => convertLength(value, drawn, unit);
  const moveX = (x: number) => length(x - origin.x);
  const moveY = (y: number) => length(y - origin.y);

  const draw = (shape: Shape, layer: string): DrawingEntity => {
    if (shape.kind === 'climb') {
      const points = shape.points.map((p) => ({ x: moveX(p.x), y: moveY(p.y), z: length(p.z) }));
      return { kind: 'polyline3d', layer, points: tidyPath(points, decimals) };
    }
    const { closed, vertices } = shape.contour;
    const moved = vertices.map((v) => ({ x: moveX(v.x), y: moveY(v.y), bulge: v.bulge }));
    return { kind: 'polyline', layer, closed, vertices: tidyContour(moved, closed, decimals) };
  };

  const layers: DrawingLayer[] = [];
  const entities: DrawingEntity[] = [];
  for (const lineSet of carriedLineSets(worked, face, profile)) {
    const layer = named.get(lineSetKey(lineSet))!;
    layers.push(layer);
    for (const shape of lineSet.shapes) entities.push(draw(shape, layer.name));
  }
  const [first, ...rest] = entities.map(entityExtents).filter((e) => e !== undefined);
  if (first === undefined) throw new DrawingRefused(`the ${face} face has no lines`);

  const labels = named.get(labelsKey(face));
  if (labels !== undefined) {
    const texts = placeLabels(worked, face);
    if (texts.length > 0) layers.push(labels);
    for (const { at, height, text } of texts) {
      const moved = { x: moveX(at.x), y: moveY(at.y) };
      entities.push({ kind: 'text', layer: labels.name, at: moved, height: length(height), text });
    }
  }
  return { unit, decimals, layers, entities, extents: joinExtents(first, ...rest) };
}
