import type { Drawing, DrawingEntity } from '#shared/kernel/drawing/drawing.ts';

const LAYER_NAME = /^[A-Z0-9_-]{1,31}$/;

const FLAT = ['x', 'y', 'bulge'];
const CLIMBING = ['x', 'y', 'z'];

/** Control characters would break the file's lines. */
const CONTROL = /\p{Cc}/u;

function refuseNumber(value: number, what: string): never {
  throw new RangeError(`drawing: ${what} is ${value}, takes a finite number`);
}

function checkNumbers(of: object, keys: readonly string[], what: string): void {
  for (const key of keys) {
    const value = (of as Record<string, number>)[key]!;
    if (!Number.isFinite(value)) refuseNumber(value, `${key} of ${what}`);
  }
}

function checkLayers(drawing: Drawing): Set<string> {
  const names = new Set<string>();
  for (const { name, colour } of drawing.layers) {
    if (!LAYER_NAME.test(name) || name === '0')
      throw new RangeError(`drawing: layer "${name}", takes 1 to 31 of A-Z 0-9 _ -, and not "0"`);
    if (names.has(name)) throw new RangeError(`drawing: layer "${name}" is there twice`);
    if (!Number.isInteger(colour) || colour < 1 || colour > 255)
      throw new RangeError(`drawing: colour of layer "${name}" is ${colour}, takes 1 to 255`);
    names.add(name);
  }
  return names;
}

function checkEntity(entity: DrawingEntity): void {
  const { layer } = entity;
  if (entity.kind === 'text') {
    checkNumbers({ ...entity.at, height: entity.height }, ['x', 'y', 'height'], `a text on layer "${layer}"`);
    if (entity.text === '' || CONTROL.test(entity.text)) {
      throw new RangeError(`drawing: text ${JSON.stringify(entity.text)} on layer "${layer}", takes one line of text`);
    }
    return;
  }
  const points = entity.kind === 'polyline' ? entity.vertices : entity.points;
  if (points.length < 2)
    throw new RangeError(`drawing: a line on layer "${layer}" has ${points.length} vertices, takes at least 2`);
  const what = `a vertex on layer "${layer}"`;
  const keys = entity.kind === 'polyline' ? FLAT : CLIMBING;
  for (const point of points) checkNumbers(point, keys, what);
}

/**
 * Refuses a drawing that no file may be written from: an unknown unit, decimals outside 4 to 6, a layer that is
 * undeclared, badly named or there twice, a number that is not finite, text with control characters, no lines at all.
 * Throws RangeError that says which, what it got and what it takes.
 */
export function checkDrawing(drawing: Drawing): void {
  const { unit, decimals, extents } = drawing;
  if (unit !== 'in' && unit !== 'mm')
    throw new RangeError(`drawing: unit is ${JSON.stringify(unit)}, takes "in" or "mm"`);
  if (![4, 5, 6].includes(decimals)) throw new RangeError(`drawing: decimals is ${decimals}, takes 4, 5 or 6`);
  checkNumbers(extents, ['minX', 'minY', 'maxX', 'maxY'], 'the extents');
  const layers = checkLayers(drawing);
  if (drawing.entities.length === 0) throw new RangeError('drawing: no lines, takes at least one');
  for (const entity of drawing.entities) {
    if (!layers.has(entity.layer)) throw new RangeError(`drawing: layer "${entity.layer}" is used but not declared`);
    checkEntity(entity);
  }
}
