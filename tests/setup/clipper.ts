import Clipper2 from 'clipper2-wasm';
import type { MainModule, PathsD } from 'clipper2-wasm/dist/clipper2z.d.ts';
import type { Point } from '#shared/kernel/contour/contour.ts';

/** clipper2-wasm: areas of polygons worked out by somebody else. All polygons are closed; arcs must be flattened before. */

// Its package is CommonJS: the factory is the default export, or lies within it, depending on who loads it.
type Factory = () => Promise<MainModule>;
const factory = ((Clipper2 as unknown as { default?: Factory }).default ?? Clipper2) as Factory;
const clipper = await factory();

/** Digits behind the point that Clipper keeps; its own integers hold the rest. */
const DIGITS = 8;

function pathsOf(polygons: readonly (readonly Point[])[]): PathsD {
  const paths = new clipper.PathsD();
  for (const polygon of polygons) {
    const path = clipper.MakePathD(polygon.flatMap((p) => [p.x, p.y]));
    paths.push_back(path);
    path.delete();
  }
  return paths;
}

function areaAndFree(...paths: PathsD[]): number {
  const area = clipper.AreaPathsD(paths.at(-1)!);
  for (const path of paths) path.delete();
  return area;
}

/** Area of the polygons together, overlaps counted once. */
export function unionArea(polygons: readonly (readonly Point[])[]): number {
  const paths = pathsOf(polygons);
  return areaAndFree(paths, clipper.UnionSelfD(paths, clipper.FillRule.NonZero, DIGITS));
}

/** Area covered by just one of two sets of polygons: 0 when they are the same shape. */
export function differenceArea(a: readonly (readonly Point[])[], b: readonly (readonly Point[])[]): number {
  const [first, second] = [pathsOf(a), pathsOf(b)];
  return areaAndFree(first, second, clipper.XorD(first, second, clipper.FillRule.NonZero, DIGITS));
}

/** What a side and the corner after it sweep when they move `distance` to their right: the side's quad, and a mitre where the corner opens. */
function sweptBy(a: Point, b: Point, c: Point, distance: number): Point[][] {
  const right = (p: Point, q: Point) => {
    const length = Math.hypot(q.x - p.x, q.y - p.y);
    return { x: (q.y - p.y) / length, y: (p.x - q.x) / length };
  };
  const [m, n] = [right(a, b), right(b, c)];
  const moved = (p: Point, by: Point, far = distance) => ({ x: p.x + by.x * far, y: p.y + by.y * far });
  const quad = [a, b, moved(b, m), moved(a, m)];
  if ((m.x * n.y - m.y * n.x) * distance <= 0) return [quad];
  // Both moved sides meet where b + distance·(m + n)/(1 + m·n) lies.
  const tip = moved(b, { x: m.x + n.x, y: m.y + n.y }, distance / (1 + m.x * n.x + m.y * n.y));
  return [quad, [b, moved(b, m), tip, moved(b, n)]];
}

/**
 * Area of a counter-clockwise polygon moved outwards by `distance` (inwards when negative), its corners mitred: the polygon with
 * all that its sides sweep added or taken away. Clipper's own inward offset leaves loops behind in sharp corners between short
 * sides, such as flattened arcs have; its unions and differences are sound.
 */
export function offsetArea(polygon: readonly Point[], distance: number): number {
  const n = polygon.length;
  const sides = polygon.flatMap((a, i) => sweptBy(a, polygon[(i + 1) % n]!, polygon[(i + 2) % n]!, distance));
  const [paths, swept] = [pathsOf([polygon]), pathsOf(sides.map(counterClockwise))];
  const band = clipper.UnionSelfD(swept, clipper.FillRule.NonZero, DIGITS);
  const combine = distance > 0 ? clipper.UnionD : clipper.DifferenceD;
  return areaAndFree(paths, swept, band, combine(paths, band, clipper.FillRule.NonZero, DIGITS));
}

function counterClockwise(polygon: readonly Point[]): readonly Point[] {
  const twice = polygon.reduce((sum, p, i) => sum + p.x * polygon.at(i - 1)!.y - polygon.at(i - 1)!.x * p.y, 0);
  return twice > 0 ? polygon.toReversed() : polygon;
}
