import type { DrawingEntity } from '#shared/kernel/drawing/drawing.ts';

/**
 * Lines of a file that coincide with another one, whichever way round and wherever they start, across layers too:
 * "LAYER and LAYER" for each pair. Compared by their corners and crowns, rounded to `tolerance`. Two layers that say
 * one cut may coincide with each other, as they do where the cutter runs on the line.
 */
export function findTwins(
  entities: readonly DrawingEntity[],
  tolerance: number,
  oneCut: ReadonlySet<string> = new Set(),
): string[] {
  const seen = new Map<string, string>();
  const twins: string[] = [];
  for (const entity of entities) {
    if (entity.kind === 'text') continue;
    const { layer } = entity;
    const key = placesKey(entity, tolerance);
    const other = seen.get(key);
    const mayCoincide = other !== layer && oneCut.has(layer) && oneCut.has(other ?? '');
    if (other !== undefined && !mayCoincide) twins.push(`${other} and ${layer}`);
    seen.set(key, layer);
  }
  return twins;
}

/** All corners, and the crown of each arc, in an order that does not depend on start or direction. */
function placesKey(entity: Exclude<DrawingEntity, { kind: 'text' }>, tolerance: number): string {
  const word = (...values: number[]) => values.map((v) => Math.round(v / tolerance)).join(',');
  if (entity.kind === 'polyline3d')
    return entity.points
      .map((p) => word(p.x, p.y, p.z))
      .sort()
      .join(' ');
  const { vertices, closed } = entity;
  const words = vertices.flatMap((v, i) => {
    const next = vertices[(i + 1) % vertices.length]!;
    const isLast = !closed && i === vertices.length - 1;
    // The crown lies off the chord's middle by bulge × half the chord, to the right for a positive bulge.
    const crown = {
      x: (v.x + next.x + v.bulge * (next.y - v.y)) / 2,
      y: (v.y + next.y - v.bulge * (next.x - v.x)) / 2,
    };
    return isLast ? [word(v.x, v.y)] : [word(v.x, v.y), `m${word(crown.x, crown.y)}`];
  });
  return words.sort().join(' ');
}
