import type { CurveSink } from './curve-sink.ts';
import { SAME_CIRCLE } from './read-tolerances.ts';

/** Lines and arcs in a row, each from where the last one ended; arcs of one circle that follow each other become one. */
export class ArcRow {
  readonly #sink: CurveSink;
  readonly #originX: number;
  readonly #originY: number;
  readonly #ends: readonly number[] | null;
  // The arc or line that waits for a next one of its circle: from (x, y) to (toX, toY), seen from the origin.
  #x = 0;
  #y = 0;
  #toX = 0;
  #toY = 0;
  #bulge = 0;
  #waits = false;
  #isFirst = true;

  /** `ends` are the exact ends of the whole row, where they are known better than by adding the origin. */
  constructor(sink: CurveSink, originX: number, originY: number, ends: readonly number[] | null) {
    this.#sink = sink;
    this.#originX = originX;
    this.#originY = originY;
    this.#ends = ends;
  }

  line(x: number, y: number): void {
    this.#put(x, y, 0);
  }

  arc(x: number, y: number, bulge: number): void {
    if (this.#waits && this.#sameCircle(x, y, bulge)) {
      // Half the sum of both sweeps, a quarter of which the bulges are the tangents of: tan(α + β).
      this.#bulge = (this.#bulge + bulge) / (1 - this.#bulge * bulge);
      this.#toX = x;
      this.#toY = y;
    } else this.#put(x, y, bulge);
  }

  finish(): void {
    this.#flush(true);
  }

  #put(x: number, y: number, bulge: number): void {
    this.#flush(false);
    this.#x = this.#toX;
    this.#y = this.#toY;
    this.#toX = x;
    this.#toY = y;
    this.#bulge = bulge;
    this.#waits = true;
  }

  #sameCircle(x: number, y: number, bulge: number): boolean {
    const both = (this.#bulge + bulge) / (1 - this.#bulge * bulge);
    if (this.#bulge * bulge <= 0 || !(both * bulge > 0 && Math.abs(both) <= 1)) return false;
    const one = centre(this.#x, this.#y, this.#toX, this.#toY, this.#bulge);
    const other = centre(this.#toX, this.#toY, x, y, bulge);
    const radius = Math.hypot(x - other[0], y - other[1]);
    return Math.hypot(one[0] - other[0], one[1] - other[1]) <= SAME_CIRCLE * radius;
  }

  #flush(isLast: boolean): void {
    if (!this.#waits) return;
    const ends = this.#ends;
    const starts = this.#isFirst && ends !== null;
    const x0 = starts ? ends[0]! : this.#x + this.#originX;
    const y0 = starts ? ends[1]! : this.#y + this.#originY;
    const x1 = isLast && ends !== null ? ends[2]! : this.#toX + this.#originX;
    const y1 = isLast && ends !== null ? ends[3]! : this.#toY + this.#originY;
    this.#sink.add(x0, y0, x1, y1, this.#bulge);
    this.#isFirst = false;
    this.#waits = false;
  }
}

function centre(x0: number, y0: number, x1: number, y1: number, bulge: number): readonly [number, number] {
  const off = (1 - bulge * bulge) / (4 * bulge);
  return [(x0 + x1) / 2 - (y1 - y0) * off, (y0 + y1) / 2 + (x1 - x0) * off];
}
