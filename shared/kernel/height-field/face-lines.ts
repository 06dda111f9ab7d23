import { contourExtents } from '../contour/contour-extents.ts';
import type { Contour, Extents, Point, Point3 } from '../contour/contour.ts';
import { buildDrawing } from '../drawing/build-drawing.ts';
import type { Drawing } from '../drawing/drawing.ts';
import type { Face } from '../line-sets/line-set.ts';
import { placeContour, placeExtents, placePoint, unplace } from '../placing/place.ts';
import type { FileProfile } from '../profiles/file-profile.ts';
import { nameLayers } from '../profiles/name-layers.ts';
import { convertLength } from '../units/convert-length.ts';
import type { DrawnFrame } from '../worked-frame.ts';
import type { FaceCut, LayerLines } from './face-cut.ts';
import { layerCuts } from './layer-cuts.ts';

/** From a file's coordinates to the face's setup in the frame's unit. */
type ToSetup = <P extends Point>(p: P) => P;

/** Numbers as they stand in the file: rounded to its decimals. The origin is the frame's lower left corner or the pins. */
function toSetup(worked: DrawnFrame, face: Face, profile: FileProfile, drawing: Drawing): ToSetup {
  const { unit } = worked.particulars;
  const { width, height } = worked.contours;
  const frame = placeExtents(worked[face].placement, { minX: 0, minY: 0, maxX: width, maxY: height });
  const origin = profile.origin === 'frame' ? { x: frame.minX, y: frame.minY } : { x: 0, y: 0 };
  const scale = 10 ** drawing.decimals;
  const length = (value: number) => convertLength(Math.round(value * scale) / scale, drawing.unit, unit);
  return (p) => {
    const moved = { ...p, x: length(p.x) + origin.x, y: length(p.y) + origin.y };
    return 'z' in p ? { ...moved, z: length(p.z as number) } : moved;
  };
}

/** The rectangle of the face's blank layer. */
function boardOf(
  worked: DrawnFrame,
  face: Face,
  profile: FileProfile,
  contoursOn: (layer: string) => Contour[],
): Extents | null {
  const layer = nameLayers(worked, profile).get(`${face}/BLANK`);
  const [blank] = layer === undefined ? [] : contoursOn(layer.name);
  return blank === undefined ? null : contourExtents(blank);
}

/**
 * What is cut from one face, read from the lines of its drawing as the file holds them, layer by layer, and brought to
 * frame view: the back through its placement turned round. Which cutter runs where and how deep comes with the layers'
 * table; no other particular is looked at. Throws DrawingRefused for a frame that cannot be drawn.
 */
export function faceLines(worked: DrawnFrame, face: Face, profile: FileProfile): FaceCut {
  const drawing = buildDrawing(worked, face, profile);
  const setup = toSetup(worked, face, profile, drawing);
  const home = unplace(worked[face].placement);

  const contoursOn = (layer: string): Contour[] =>
    drawing.entities.flatMap((e) =>
      e.kind === 'polyline' && e.layer === layer
        ? [placeContour(home, { closed: e.closed, vertices: e.vertices.map(setup) })]
        : [],
    );
  const climbsOn = (layer: string): Point3[][] =>
    drawing.entities.flatMap((e) =>
      e.kind === 'polyline3d' && e.layer === layer
        ? [e.points.map(setup).map((p) => ({ ...placePoint(home, p), z: p.z }))]
        : [],
    );

  const layers = layerCuts(worked, face, profile).map((cut): LayerLines => ({
    ...cut,
    contours: contoursOn(cut.layer),
    climbs: climbsOn(cut.layer),
  }));
  return { face, thickness: worked.particulars.thickness, board: boardOf(worked, face, profile, contoursOn), layers };
}
