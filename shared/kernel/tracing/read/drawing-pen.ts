import { STRAIGHT_BULGE } from '../../tolerances.ts';
import type { CurveSink } from './curve-sink.ts';
import { ellipsePieces } from './ellipse-pieces.ts';
import type { Piece } from './bezier-piece.ts';
import { fitArcs } from './fit-arcs.ts';
import { keepsCircles, turn, turnedOver, type Placement } from './placement.ts';
import { LEAST_CHORD, RELATIVE_CHORD, ROUND_PLACEMENT, WHOLE_TURN } from './read-tolerances.ts';

/**
 * Draws what an entity says, in the entity's own coordinates, into the sink, in the drawing's: through the placement of
 * the block it stands in. No arc it draws spans more than half a turn. Ellipses and splines become arcs and lines.
 */
export class DrawingPen {
  /** How many curves of the present entity were not drawn as they are, but as arcs and lines along them. */
  fitted = 0;
  /** A curve of the present entity could not be followed. */
  lost = false;
  readonly #sink: CurveSink;
  readonly #chord: number | null;
  #placement: Placement;
  #base: Placement;
  #round = true;
  #mirror = 1;

  /** `chord` is the tolerance of fitted curves in drawing units; null for a share of each curve's size. */
  constructor(sink: CurveSink, chord: number | null, placement: Placement) {
    this.#sink = sink;
    this.#chord = chord;
    this.#placement = placement;
    this.#base = placement;
    this.#take(placement);
  }

  /** The placement of the block that is being drawn. */
  setBase(placement: Placement): void {
    this.#base = placement;
    this.#take(placement);
  }

  begin(): void {
    this.fitted = 0;
    this.lost = false;
    if (this.#placement !== this.#base) this.#take(this.#base);
    this.#sink.begin();
  }

  /** What is drawn from here on is seen from below, as extrusion (0, 0, −1) has it. */
  turnOver(): void {
    this.#take(turnedOver(this.#base));
  }

  line(x0: number, y0: number, x1: number, y1: number): void {
    const { a, b, c, d, e, f } = this.#placement;
    this.#sink.add(a * x0 + c * y0 + e, b * x0 + d * y0 + f, a * x1 + c * y1 + e, b * x1 + d * y1 + f, 0);
  }

  /** From one place to another with a bulge (DXF Reference, LWPOLYLINE, group 42). */
  bulge(x0: number, y0: number, x1: number, y1: number, bulge: number): void {
    if (Math.abs(bulge) <= STRAIGHT_BULGE) return this.line(x0, y0, x1, y1);
    if (x0 === x1 && y0 === y1) return;
    const off = (1 - bulge * bulge) / (4 * bulge);
    const cx = (x0 + x1) / 2 - (y1 - y0) * off;
    const cy = (y0 + y1) / 2 + (x1 - x0) * off;
    if (!this.#round) {
      // The ellipse's own start is the arc's: U points to it, so that the ends are met exactly.
      const ux = x0 - cx;
      const uy = y0 - cy;
      this.#ellipse(cx, cy, ux, uy, -uy, ux, 0, 4 * Math.atan(bulge), [x0, y0, x1, y1]);
      return;
    }
    if (Math.abs(bulge) <= 1) return this.#arc(x0, y0, x1, y1, bulge);
    // Over half a turn: by way of the middle of the arc, which lies bulge half chords off the chord's middle.
    const mx = (x0 + x1) / 2 + ((y1 - y0) * bulge) / 2;
    const my = (y0 + y1) / 2 - ((x1 - x0) * bulge) / 2;
    const half = Math.tan(Math.atan(bulge) / 2);
    this.#arc(x0, y0, mx, my, half);
    this.#arc(mx, my, x1, y1, half);
  }

  /** A circle's arc, counter-clockwise from one angle to another, in degrees; all of it where they are the same. */
  arc(cx: number, cy: number, radius: number, from: number, to: number): void {
    let sweep = (to - from) % 360;
    if (sweep < 0) sweep += 360;
    if (sweep === 0) sweep = 360;
    const halves = sweep > 180 ? 2 : 1;
    // Whole circles come as two halves from a place that is exact.
    const middle = from + sweep / halves;
    const bulge = Math.tan((sweep / halves) * (Math.PI / 720));
    const [startX, startY] = turn(from);
    const [middleX, middleY] = turn(middle);
    const [endX, endY] = sweep === 360 ? [startX, startY] : turn(to);
    const x0 = cx + radius * startX;
    const y0 = cy + radius * startY;
    const x2 = cx + radius * endX;
    const y2 = cy + radius * endY;
    if (halves === 1) return this.bulge(x0, y0, x2, y2, Math.min(bulge, 1));
    const x1 = cx + radius * middleX;
    const y1 = cy + radius * middleY;
    this.bulge(x0, y0, x1, y1, Math.min(bulge, 1));
    this.bulge(x1, y1, x2, y2, Math.min(bulge, 1));
  }

  /** Part of an ellipse: centre + U cos t + V sin t for t from `from` over `sweep` radians. */
  ellipse(cx: number, cy: number, ux: number, uy: number, vx: number, vy: number, from: number, sweep: number): void {
    this.#ellipse(cx, cy, ux, uy, vx, vy, from, sweep, null);
  }

  /** A row of rational Bézier pieces of one degree, each three numbers a control point: x·w, y·w, w. */
  pieces(pieces: readonly Piece[], ends: readonly number[] | null = null): void {
    const { a, b, c, d, e, f } = this.#placement;
    const placed = pieces.map((piece) => {
      const out = new Float64Array(piece.length);
      for (let i = 0; i < piece.length; i += 3) {
        const [x, y, w] = [piece[i]!, piece[i + 1]!, piece[i + 2]!];
        out[i] = a * x + c * y + e * w;
        out[i + 1] = b * x + d * y + f * w;
        out[i + 2] = w;
      }
      return out;
    });
    const placedEnds = ends === null ? null : ends.map((_, i) => this.#place(ends, i));
    this.fitted++;
    const tolerance = this.#tolerance(placed);
    if (!(tolerance > 0)) {
      this.#sink.outOfRange = true;
      return;
    }
    if (!fitArcs(placed, tolerance, this.#sink, placedEnds)) this.lost = true;
  }

  #place(points: readonly number[], i: number): number {
    const { a, b, c, d, e, f } = this.#placement;
    const x = points[i - (i % 2)]!;
    const y = points[i - (i % 2) + 1]!;
    return i % 2 === 0 ? a * x + c * y + e : b * x + d * y + f;
  }

  #ellipse(
    cx: number,
    cy: number,
    ux: number,
    uy: number,
    vx: number,
    vy: number,
    from: number,
    sweep: number,
    ends: readonly number[] | null,
  ): void {
    const size = ux * ux + uy * uy;
    const isCircle =
      Math.abs(size - vx * vx - vy * vy) <= ROUND_PLACEMENT * size &&
      Math.abs(ux * vx + uy * vy) <= ROUND_PLACEMENT * size;
    if (!isCircle || !this.#round) {
      this.pieces(ellipsePieces(cx, cy, ux, uy, vx, vy, from, sweep, ends), ends);
      return;
    }
    const at = (t: number) => {
      const [cos, sin] = turn((t * 180) / Math.PI);
      return [cx + ux * cos + vx * sin, cy + uy * cos + vy * sin] as const;
    };
    const whole = Math.abs(Math.abs(sweep) - 2 * Math.PI) <= WHOLE_TURN;
    const halves = Math.abs(sweep) > Math.PI ? 2 : 1;
    const bulge = Math.sign(ux * vy - uy * vx) * Math.tan(sweep / halves / 4);
    const [x0, y0] = at(from);
    const [x2, y2] = whole ? [x0, y0] : at(from + sweep);
    if (halves === 1) return this.bulge(x0, y0, x2, y2, bulge);
    const [x1, y1] = at(from + sweep / 2);
    this.bulge(x0, y0, x1, y1, Math.max(-1, Math.min(1, bulge)));
    this.bulge(x1, y1, x2, y2, Math.max(-1, Math.min(1, bulge)));
  }

  #arc(x0: number, y0: number, x1: number, y1: number, bulge: number): void {
    const { a, b, c, d, e, f } = this.#placement;
    const mirrored = this.#mirror * bulge;
    this.#sink.add(a * x0 + c * y0 + e, b * x0 + d * y0 + f, a * x1 + c * y1 + e, b * x1 + d * y1 + f, mirrored);
  }

  #take(placement: Placement): void {
    this.#placement = placement;
    this.#round = keepsCircles(placement);
    this.#mirror = placement.a * placement.d - placement.b * placement.c < 0 ? -1 : 1;
  }

  #tolerance(pieces: readonly Piece[]): number {
    let minX = Infinity;
    let minY = Infinity;
    let maxX = -Infinity;
    let maxY = -Infinity;
    for (const piece of pieces)
      for (let i = 0; i < piece.length; i += 3) {
        const x = piece[i]! / piece[i + 2]!;
        const y = piece[i + 1]! / piece[i + 2]!;
        minX = Math.min(minX, x);
        maxX = Math.max(maxX, x);
        minY = Math.min(minY, y);
        maxY = Math.max(maxY, y);
      }
    const size = Math.max(maxX - minX, maxY - minY);
    const away = Math.max(Math.abs(minX), Math.abs(maxX), Math.abs(minY), Math.abs(maxY));
    return Math.max(this.#chord ?? RELATIVE_CHORD * size, LEAST_CHORD * Math.max(size, away));
  }
}
