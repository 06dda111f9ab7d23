import { segmentBounds } from '../contour/intersect-segments.ts';
import type { ArcSegment, LineSegment, Segment } from '../contour/segments.ts';
import type { Point } from '../contour/contour.ts';
import { endColumn, endRow, firstColumn, firstRow, sampleX, sampleY, type Grid } from './grid.ts';

/** Columns to a block. */
const BLOCK = 32;

/**
 * Squared distances from a band of a grid's rows to the nearest of some lines and arcs, exact, as far as each one's reach;
 * Infinity beyond. The band is used again and again: it knows which blocks of columns were touched, since lines fill little of
 * a board.
 */
export class DistanceBand {
  readonly grid: Grid;
  /** Row by row from the band's first; double precision, so that a sample on a wall falls on the right side of it. */
  readonly square: Float64Array;
  private readonly blocks: number;
  private readonly touched: Uint8Array;
  private first = 0;
  private end = 0;

  constructor(grid: Grid, rows: number) {
    this.grid = grid;
    this.square = new Float64Array(grid.columns * rows).fill(Infinity);
    this.blocks = Math.ceil(grid.columns / BLOCK);
    this.touched = new Uint8Array(this.blocks * rows);
  }

  /** Begins anew on rows `first` up to but not `end` of the grid. */
  begin(first: number, end: number): void {
    const { columns } = this.grid;
    const { blocks, touched } = this;
    for (let at = 0; at < touched.length; at++) {
      if (touched[at] === 0) continue;
      touched[at] = 0;
      const row = Math.floor(at / blocks);
      const from = (at - row * blocks) * BLOCK;
      this.square.fill(Infinity, row * columns + from, row * columns + Math.min(columns, from + BLOCK));
    }
    this.first = first;
    this.end = end;
  }

  /** Calls with each stretch of a row's columns, [from, to), that may hold a distance. */
  eachTouched(row: number, take: (from: number, to: number) => void): void {
    const start = (row - this.first) * this.blocks;
    for (let block = 0; block < this.blocks; block++) {
      if (this.touched[start + block] === 0) continue;
      const from = block;
      while (block < this.blocks && this.touched[start + block] !== 0) block++;
      take(from * BLOCK, Math.min(this.grid.columns, block * BLOCK));
    }
  }

  /** Index in `square` of a row's first column. */
  rowStart(row: number): number {
    return (row - this.first) * this.grid.columns;
  }

  /** Takes in one line or arc: every sample within `reach` of it learns its distance when that is the nearest yet. */
  spread(segment: Segment, reach: number): void {
    const box = segmentBounds(segment);
    const bottom = Math.max(this.first, firstRow(this.grid, box.minY - reach));
    const top = Math.min(this.end, endRow(this.grid, box.maxY + reach));
    if (
      bottom >= top ||
      box.minX - reach > this.grid.minX + this.grid.columns * this.grid.cell ||
      box.maxX + reach < this.grid.minX
    )
      return;
    if (segment.kind === 'line') this.spreadLine(segment, reach, bottom, top);
    else this.spreadArc(segment, reach, bottom, top, box.minX - reach, box.maxX + reach);
    this.spreadPoint(segment.a, reach);
    this.spreadPoint(segment.b, reach);
  }

  private touch(row: number, from: number, to: number): void {
    const start = (row - this.first) * this.blocks;
    this.touched.fill(1, start + Math.floor(from / BLOCK), start + Math.floor((to - 1) / BLOCK) + 1);
  }

  private spreadPoint({ x, y }: Point, reach: number): void {
    const { grid, square } = this;
    const top = Math.min(this.end, endRow(grid, y + reach));
    for (let row = Math.max(this.first, firstRow(grid, y - reach)); row < top; row++) {
      const dy = sampleY(grid, row) - y;
      const half = Math.sqrt(Math.max(0, reach * reach - dy * dy));
      const from = firstColumn(grid, x - half);
      const to = endColumn(grid, x + half);
      if (from >= to) continue;
      this.touch(row, from, to);
      const start = this.rowStart(row);
      for (let i = from; i < to; i++) {
        const dx = sampleX(grid, i) - x;
        const d = dx * dx + dy * dy;
        if (d < square[start + i]!) square[start + i] = d;
      }
    }
  }

  /** The rectangle beside a line; its ends are points of their own. */
  private spreadLine({ a, b }: LineSegment, reach: number, bottom: number, top: number): void {
    const { grid, square } = this;
    const length = Math.hypot(b.x - a.x, b.y - a.y);
    if (length === 0) return;
    const ux = (b.x - a.x) / length;
    const uy = (b.y - a.y) / length;
    for (let row = bottom; row < top; row++) {
      const dy = sampleY(grid, row) - a.y;
      let low = -Infinity;
      let high = Infinity;
      // Across: |ux·dy − uy·dx| ≤ reach. Along: 0 ≤ ux·dx + uy·dy ≤ length. Both are ranges of dx.
      if (uy !== 0) {
        const p = (ux * dy - reach) / uy;
        const q = (ux * dy + reach) / uy;
        low = Math.min(p, q);
        high = Math.max(p, q);
      } else if (Math.abs(dy) > reach) continue;
      if (ux !== 0) {
        const p = (-uy * dy) / ux;
        const q = (length - uy * dy) / ux;
        low = Math.max(low, Math.min(p, q));
        high = Math.min(high, Math.max(p, q));
      } else if (uy * dy < 0 || uy * dy > length) continue;
      const from = firstColumn(grid, a.x + low);
      const to = endColumn(grid, a.x + high);
      if (from >= to) continue;
      this.touch(row, from, to);
      const start = this.rowStart(row);
      for (let i = from; i < to; i++) {
        const across = ux * dy - uy * (sampleX(grid, i) - a.x);
        const d = across * across;
        if (d < square[start + i]!) square[start + i] = d;
      }
    }
  }

  /** The part of a ring beside an arc, within its sweep. */
  private spreadArc(arc: ArcSegment, reach: number, bottom: number, top: number, left: number, right: number): void {
    const { grid, square } = this;
    const { centre, radius, sweep } = arc;
    const outer = radius + reach;
    const inner = Math.max(0, radius - reach);
    const [begin, finish] = sweep > 0 ? [arc.a, arc.b] : [arc.b, arc.a];
    const [bx, by, fx, fy] = [begin.x - centre.x, begin.y - centre.y, finish.x - centre.x, finish.y - centre.y];
    const isWide = Math.abs(sweep) > Math.PI;
    const fillColumns = (row: number, dy: number, low: number, high: number): void => {
      const from = firstColumn(grid, Math.max(left, low));
      const to = endColumn(grid, Math.min(right, high));
      if (from >= to) return;
      this.touch(row, from, to);
      const start = this.rowStart(row);
      for (let i = from; i < to; i++) {
        const dx = sampleX(grid, i) - centre.x;
        const afterBegin = bx * dy - by * dx >= 0;
        const beforeFinish = dx * fy - dy * fx >= 0;
        if (isWide ? !(afterBegin || beforeFinish) : !(afterBegin && beforeFinish)) continue;
        const off = Math.sqrt(dx * dx + dy * dy) - radius;
        const d = off * off;
        if (d < square[start + i]!) square[start + i] = d;
      }
    };
    for (let row = bottom; row < top; row++) {
      const dy = sampleY(grid, row) - centre.y;
      if (Math.abs(dy) > outer) continue;
      const far = Math.sqrt(outer * outer - dy * dy);
      const near = Math.abs(dy) < inner ? Math.sqrt(inner * inner - dy * dy) : 0;
      if (near === 0) fillColumns(row, dy, centre.x - far, centre.x + far);
      else {
        fillColumns(row, dy, centre.x - far, centre.x - near);
        fillColumns(row, dy, centre.x + near, centre.x + far);
      }
    }
  }
}
