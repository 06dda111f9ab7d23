import type { FoundCurves } from '../found-drawing.ts';
import { DrawingTooBig } from './drawing-too-big.ts';
import { FARTHEST, type ReadLimits } from './read-limits.ts';

const STRIDE = 5;

/**
 * Takes in segments of one entity after another. An entity is begun, its segments added, and then kept or dropped as a
 * whole; segments without length are left out.
 */
export class CurveSink {
  /** A coordinate of the present entity was too far out, or no number after all. */
  outOfRange = false;
  #limits: ReadLimits;
  #segments: Float64Array<ArrayBuffer>;
  #entityOf: Uint32Array<ArrayBuffer>;
  #count = 0;
  #begun = 0;
  #entities = 0;
  #fits = 0;

  /** `expected` segments fit without growing. */
  constructor(limits: ReadLimits, expected: number) {
    this.#limits = limits;
    const size = Math.min(Math.max(Math.ceil(expected), 1), limits.segments);
    this.#segments = new Float64Array(STRIDE * size);
    this.#entityOf = new Uint32Array(size);
  }

  begin(): void {
    this.#begun = this.#count;
    this.outOfRange = false;
  }

  /** Whether the present entity has drawn anything. */
  get hasDrawn(): boolean {
    return this.#count > this.#begun;
  }

  keep(): void {
    this.#entities++;
  }

  drop(): void {
    this.#count = this.#begun;
  }

  /** A segment of the present entity. Throws DrawingTooBig. */
  add(x0: number, y0: number, x1: number, y1: number, bulge: number): void {
    // Written so that what is no number fails as well.
    if (!(
      Math.abs(x0) <= FARTHEST &&
      Math.abs(y0) <= FARTHEST &&
      Math.abs(x1) <= FARTHEST &&
      Math.abs(y1) <= FARTHEST
    )) {
      this.outOfRange = true;
      return;
    }
    if (!Number.isFinite(bulge)) {
      this.outOfRange = true;
      return;
    }
    if (x0 === x1 && y0 === y1) return;
    const at = this.#count * STRIDE;
    if (at === this.#segments.length) this.#grow();
    const segments = this.#segments;
    // Adding 0 makes 0 of −0.
    segments[at] = x0 + 0;
    segments[at + 1] = y0 + 0;
    segments[at + 2] = x1 + 0;
    segments[at + 3] = y1 + 0;
    segments[at + 4] = bulge + 0;
    this.#entityOf[this.#count++] = this.#entities;
  }

  /** Counts an attempt to lay arcs along a curve. Throws DrawingTooBig. */
  countFit(): void {
    if (++this.#fits > this.#limits.fits)
      throw new DrawingTooBig(
        'too-much-to-fit',
        'The ellipses and splines of this drawing take more arcs than are made of one drawing. Export them as polylines, or take a coarser chord tolerance.',
      );
  }

  curves(): FoundCurves {
    return {
      count: this.#count,
      segments: this.#segments.slice(0, this.#count * STRIDE),
      entityOf: this.#entityOf.slice(0, this.#count),
    };
  }

  #grow(): void {
    if (this.#count >= this.#limits.segments)
      throw new DrawingTooBig(
        'too-many-segments',
        `This drawing comes to more than ${this.#limits.segments.toLocaleString('en')} lines and arcs. Export what belongs to the frame only.`,
      );
    const size = Math.min(this.#count * 2, this.#limits.segments);
    const segments = new Float64Array(size * STRIDE);
    segments.set(this.#segments);
    this.#segments = segments;
    const entityOf = new Uint32Array(size);
    entityOf.set(this.#entityOf);
    this.#entityOf = entityOf;
  }
}
