import type { Drawing, DrawingEntity } from '#shared/kernel/drawing/drawing.ts';

/** A drawing's entities layer by layer, as both flavours write them; within a layer in the drawing's own order. */
export function inLayerOrder(drawing: Drawing): DrawingEntity[] {
  const byLayer = new Map<string, DrawingEntity[]>(drawing.layers.map(({ name }) => [name, []]));
  for (const entity of drawing.entities) byLayer.get(entity.layer)!.push(entity);
  return [...byLayer.values()].flat();
}
