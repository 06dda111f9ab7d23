import type { Contour, Extents, Point } from '../contour/contour.ts';
import { polygon, rectangle } from '../contour/make-contour.ts';
import { WELD } from '../tolerances.ts';
import type { DadoOutline } from './dado-outline.ts';
import type { FeatureId } from './members.ts';

/** The outline of dados that touch or cross: outer lines counter-clockwise, islands left standing clockwise. */
export interface MergedDado {
  readonly contours: readonly Contour[];
  readonly of: readonly FeatureId[];
}

const touch = (a: Extents, b: Extents) =>
  a.minX <= b.maxX + WELD && b.minX <= a.maxX + WELD && a.minY <= b.maxY + WELD && b.minY <= a.maxY + WELD;

/** Groups of dados that hang together. */
function components(dados: readonly DadoOutline[]): DadoOutline[][] {
  const groups: DadoOutline[][] = [];
  for (const dado of dados) {
    const joined = groups.filter((g) => g.some((d) => touch(d.extents, dado.extents)));
    const rest = groups.filter((g) => !joined.includes(g));
    groups.splice(0, groups.length, ...rest, [...joined.flat(), dado]);
  }
  return groups;
}

/** Merges dados of one depth into outlines of lines and true corners, without slivers. Order follows the first dado of each. */
export function mergeDados(dados: readonly DadoOutline[]): MergedDado[] {
  return components(dados)
    .map((group) => [...group].sort((a, b) => a.index - b.index))
    .sort((a, b) => a[0]!.index - b[0]!.index)
    .map((group) => ({
      of: group.map((d) => d.id),
      contours: group.length === 1 ? [rectangle(group[0]!.extents)] : uniteRectangles(group.map((d) => d.extents)),
    }));
}

/** Sorted coordinates, those nearer than WELD taken as one. */
function grid(values: number[]): number[] {
  const out: number[] = [];
  for (const v of values.sort((a, b) => a - b)) if (out.length === 0 || v - out[out.length - 1]! > WELD) out.push(v);
  return out;
}
const cell = (lines: readonly number[], value: number) => lines.findIndex((line) => Math.abs(line - value) <= WELD);

/** Union of upright rectangles: mark the cells between all their lines, then walk the border with the inside on the left. */
function uniteRectangles(boxes: readonly Extents[]): Contour[] {
  const xs = grid(boxes.flatMap((b) => [b.minX, b.maxX]));
  const ys = grid(boxes.flatMap((b) => [b.minY, b.maxY]));
  const columns = xs.length - 1;
  const rows = ys.length - 1;
  const filled = new Uint8Array(columns * rows);
  for (const b of boxes) {
    const [x0, x1, y0, y1] = [cell(xs, b.minX), cell(xs, b.maxX), cell(ys, b.minY), cell(ys, b.maxY)];
    for (let j = y0; j < y1; j++) filled.fill(1, j * columns + x0, j * columns + x1);
  }
  const full = (i: number, j: number) => i >= 0 && j >= 0 && i < columns && j < rows && filled[j * columns + i] === 1;

  // Border edges by their start node; 0 east, 1 north, 2 west, 3 south; the full cell lies on the left.
  const edges = new Map<number, Set<number>>();
  const nodeOf = (i: number, j: number) => j * xs.length + i;
  const add = (i: number, j: number, direction: number) => {
    const at = nodeOf(i, j);
    const set = edges.get(at) ?? new Set();
    edges.set(at, set.add(direction));
  };
  for (let j = 0; j < rows; j++)
    for (let i = 0; i < columns; i++) {
      if (!full(i, j)) continue;
      if (!full(i, j - 1)) add(i, j, 0);
      if (!full(i + 1, j)) add(i + 1, j, 1);
      if (!full(i, j + 1)) add(i + 1, j + 1, 2);
      if (!full(i - 1, j)) add(i, j + 1, 3);
    }

  const contours: Contour[] = [];
  const step = [1, xs.length, -1, -xs.length];
  const walked = new Set<number>();
  for (const [start, out] of edges)
    for (const first of out) {
      if (walked.has(start * 4 + first)) continue;
      const corners: Point[] = [];
      let at = start;
      let direction = first;
      do {
        walked.add(at * 4 + direction);
        at += step[direction]!;
        const onward = edges.get(at)!;
        // Left first, so that cells that meet at a corner only stay apart.
        const next = [direction + 1, direction, direction + 3].map((d) => d % 4).find((d) => onward.has(d))!;
        if (next !== direction) corners.push({ x: xs[at % xs.length]!, y: ys[Math.floor(at / xs.length)]! });
        direction = next;
      } while (at !== start || direction !== first);
      contours.push(polygon(corners));
    }
  return contours;
}
