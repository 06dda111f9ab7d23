import type { Point } from '../contour/contour.ts';
import type { SectionWindow } from './section-window.ts';

/** The runs of a line of points (y, depth) within a window, cut where it crosses the window's border. */
export function clipLine(points: readonly Point[], window: SectionWindow): Point[][] {
  const runs: Point[][] = [];
  let run: Point[] = [];
  for (let i = 1; i < points.length; i++) {
    const piece = clipSegment(points[i - 1]!, points[i]!, window);
    if (!piece) {
      if (run.length > 1) runs.push(run);
      run = [];
      continue;
    }
    const [a, b] = piece;
    const last = run[run.length - 1];
    if (!last || last.x !== a.x || last.y !== a.y) {
      if (run.length > 1) runs.push(run);
      run = [a];
    }
    run.push(b);
  }
  if (run.length > 1) runs.push(run);
  return runs;
}

/** Liang and Barsky's clipping of one segment. */
function clipSegment(a: Point, b: Point, { minY, maxY, top, bottom }: SectionWindow): [Point, Point] | undefined {
  const dx = b.x - a.x;
  const dy = b.y - a.y;
  let from = 0;
  let to = 1;
  for (const [p, q] of [
    [-dx, a.x - minY],
    [dx, maxY - a.x],
    [-dy, a.y - top],
    [dy, bottom - a.y],
  ] as const) {
    if (p === 0) {
      if (q < 0) return undefined;
      continue;
    }
    const r = q / p;
    if (p < 0) from = Math.max(from, r);
    else to = Math.min(to, r);
    if (from > to) return undefined;
  }
  const at = (t: number): Point => (t === 0 ? a : t === 1 ? b : { x: a.x + t * dx, y: a.y + t * dy });
  return [at(from), at(to)];
}
