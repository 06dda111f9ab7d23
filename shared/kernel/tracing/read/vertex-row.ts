import type { DrawingPen } from './drawing-pen.ts';

/** Vertices of one polyline after another, in memory that is used again. */
export class VertexRow {
  count = 0;
  xs = new Float64Array(256);
  ys = new Float64Array(256);
  bulges = new Float64Array(256);

  clear(): void {
    this.count = 0;
  }

  add(x: number, y: number, bulge: number): void {
    const i = this.count++;
    if (i === this.xs.length) {
      this.xs = wider(this.xs);
      this.ys = wider(this.ys);
      this.bulges = wider(this.bulges);
    }
    this.xs[i] = x;
    this.ys[i] = y;
    this.bulges[i] = bulge;
  }

  /** Draws from each vertex to the next, and from the last to the first where it is closed. */
  draw(pen: DrawingPen, closed: boolean): void {
    const { xs, ys, bulges, count } = this;
    for (let i = 1; i < count; i++) pen.bulge(xs[i - 1]!, ys[i - 1]!, xs[i]!, ys[i]!, bulges[i - 1]!);
    const last = count - 1;
    if (closed && count > 1) pen.bulge(xs[last]!, ys[last]!, xs[0]!, ys[0]!, bulges[last]!);
  }
}

function wider(old: Float64Array<ArrayBuffer>): Float64Array<ArrayBuffer> {
  const next = new Float64Array(old.length * 2);
  next.set(old);
  return next;
}
