import DxfDrawing from 'dxf-writer';
import Handle from 'dxf-writer/src/Handle.js';
import type { Drawing, DrawingEntity } from '#shared/kernel/drawing/drawing.ts';
import { BULGE_DECIMALS, formatNumber } from './format-number.ts';
import { headerValues } from './header-values.ts';
import { inLayerOrder } from './layer-order.ts';
import { mendTags, type TaggedShape } from './mend-tags.ts';

/** dxf-writer's drawing as we use it: it writes what it gets, so numbers go in as text of fixed decimals. */
interface TextDrawing {
  layers: Record<string, { getShapes(): TaggedShape[] }>;
  setUnits(unit: string): void;
  header(name: string, values: readonly (readonly [number, string])[]): void;
  addLayer(name: string, colour: number, lineType: string): void;
  setActiveLayer(name: string): void;
  drawPolyline(points: string[][], closed: boolean): void;
  drawPolyline3d(points: string[][]): void;
  drawText(x: string, y: string, height: string, rotation: string, text: string): void;
  toDxfString(): string;
}

// dxf-writer's setUnits takes these names alone; with any other it writes an empty value.
const UNIT_NAMES = { in: 'Inches', mm: 'Millimeters' } as const;

/** DXF Reference, POLYLINE group 70: a 3D polyline. dxf-writer 1.18.4 writes 0, which says flat. */
const CLIMBS = 8;

/** Groups 10 to 59 are numbers with a point (DXF Reference, group code value types). */
const isReal = (code: number): boolean => code >= 10 && code <= 59;

/**
 * A drawing as R2007 (AC1021) through dxf-writer. Its handle counter is one for the whole process and starts afresh
 * here, so that the same drawing gives the same text; all is done in one go, no other drawing can come between.
 */
export function writeR2007(drawing: Drawing): string {
  Handle.seed = 0;
  const file = new DxfDrawing() as unknown as TextDrawing;
  file.setUnits(UNIT_NAMES[drawing.unit]);
  for (const [name, values] of headerValues(drawing)) file.header(name, values);
  for (const { name, colour } of drawing.layers) file.addLayer(name, colour, 'CONTINUOUS');

  const n = (value: number) => formatNumber(value, drawing.decimals);
  const fixed = (code: number, value: string | number) =>
    typeof value === 'number' && isReal(code) ? n(value) : value;
  const lastShape = (layer: string) => file.layers[layer]!.getShapes().at(-1)!;

  const draw = (entity: DrawingEntity) => {
    file.setActiveLayer(entity.layer);
    if (entity.kind === 'polyline') {
      const points = entity.vertices.map((v) =>
        v.bulge === 0 ? [n(v.x), n(v.y)] : [n(v.x), n(v.y), formatNumber(v.bulge, BULGE_DECIMALS)],
      );
      file.drawPolyline(points, entity.closed);
    } else if (entity.kind === 'polyline3d') {
      file.drawPolyline3d(entity.points.map((p) => [n(p.x), n(p.y), n(p.z)]));
      mendTags(lastShape(entity.layer), (code, value) => (code === 70 && value === 0 ? CLIMBS : fixed(code, value)));
    } else {
      file.drawText(n(entity.at.x), n(entity.at.y), n(entity.height), n(0), entity.text);
      mendTags(lastShape(entity.layer), fixed);
    }
  };
  inLayerOrder(drawing).forEach(draw);
  return `${file.toDxfString()}\n`;
}
