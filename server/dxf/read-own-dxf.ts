import DxfParser, { type ILwpolylineEntity, type IPolylineEntity, type ITextEntity } from 'dxf-parser';
import type { Point3 } from '#shared/kernel/contour/contour.ts';
import type { DrawingEntity, DrawingLayer } from '#shared/kernel/drawing/drawing.ts';

/** A DXF of ours as an independent reader sees it. */
export interface ReadDxf {
  /** Header variables as they stand, by name with "$"; undefined where the file has none. */
  readonly header: Readonly<Record<string, unknown>>;
  /** In the file's order, without layer 0. */
  readonly layers: readonly DrawingLayer[];
  readonly entities: readonly DrawingEntity[];
  /** What no entity may have: a height or extrusion off the plane, or a colour of its own. */
  readonly strays: readonly string[];
}

/** Group 62 of an entity whose colour is that of its layer (DXF Reference). */
const BY_LAYER = 256;

/** dxf-parser leaves out what the file leaves out. */
type Loose<T> = { [K in keyof T]?: T[K] };

function readLwPolyline(entity: Loose<ILwpolylineEntity>, strays: string[]): DrawingEntity {
  const { layer = '', vertices = [], shape = false, elevation = 0, extrusionDirectionZ = 1 } = entity;
  if (elevation !== 0 || extrusionDirectionZ !== 1) strays.push(`a line on ${layer} is off the plane`);
  return { kind: 'polyline', layer, closed: shape, vertices: vertices.map(({ x, y, bulge = 0 }) => ({ x, y, bulge })) };
}

function readPolyline(entity: Loose<IPolylineEntity>, strays: string[]): DrawingEntity {
  const { layer = '', vertices = [], shape = false, extrusionDirection } = entity;
  const stray = vertices.find((v) => v.layer !== layer);
  if (stray) throw new Error(`a vertex of a line on ${layer} lies on ${stray.layer}`);
  if (entity.is3dPolyline) {
    if (!vertices.every((v) => v.threeDPolylineVertex))
      throw new Error(`a climbing line on ${layer} has a vertex without flag 32`);
    return { kind: 'polyline3d', layer, points: vertices.map(({ x, y, z }): Point3 => ({ x, y, z })) };
  }
  if (extrusionDirection || vertices.some((v) => v.z !== 0)) strays.push(`a line on ${layer} is off the plane`);
  return {
    kind: 'polyline',
    layer,
    closed: shape,
    vertices: vertices.map(({ x, y, bulge = 0 }: Loose<Point3> & { bulge?: number }) => ({ x: x!, y: y!, bulge })),
  };
}

function readText({ layer = '', startPoint, textHeight, text = '' }: Loose<ITextEntity>): DrawingEntity {
  const plain = text.replace(/\\U\+([0-9A-F]{4})/g, (_, hex: string) => String.fromCharCode(parseInt(hex, 16)));
  return { kind: 'text', layer, at: { x: startPoint!.x, y: startPoint!.y }, height: textHeight!, text: plain };
}

// dxf-parser runs for ever on a POLYLINE whose SEQEND is missing, so that is looked at first.
function refuseTorn(text: string): void {
  if (!/\n\s*0\nEOF\n$/.test(text)) throw new Error('the file does not end with EOF');
  const count = (name: string) => text.split(`\n${name}\n`).length - 1;
  if (count('POLYLINE') !== count('SEQEND')) throw new Error('a POLYLINE without its SEQEND');
}

/** Reads a DXF that we wrote, through dxf-parser. Not for files from strangers. Throws when it cannot be read or holds what we never write. */
export function readOwnDxf(text: string): ReadDxf {
  refuseTorn(text);
  const file = new DxfParser().parse(text);
  if (!file?.header || !file.tables?.layer || !file.entities)
    throw new Error('a section is missing: takes HEADER, TABLES with LAYER, ENTITIES');
  const strays: string[] = [];
  const entities = file.entities.map((entity) => {
    if ((entity.colorIndex ?? BY_LAYER) !== BY_LAYER)
      strays.push(`a ${entity.type} on ${entity.layer} has colour ${entity.colorIndex}`);
    switch (entity.type as string) {
      case 'LWPOLYLINE':
        return readLwPolyline(entity as Loose<ILwpolylineEntity>, strays);
      case 'POLYLINE':
        return readPolyline(entity as Loose<IPolylineEntity>, strays);
      case 'TEXT':
        return readText(entity as Loose<ITextEntity>);
      default:
        throw new Error(`holds a ${entity.type}, which is never written`);
    }
  });
  const layers = Object.values(file.tables.layer.layers)
    .filter(({ name }) => name !== '0')
    .map(({ name, colorIndex }) => ({ name, colour: colorIndex }));
  return { header: file.header, layers, entities, strays };
}
