import type { Cutter } from '../cutters/cutter.ts';

const radians = (degrees: number) => (degrees * Math.PI) / 180;

/**
 * Depth below the face that a cutter, standing with its tip at `tip`, leaves at a squared distance from its axis: tip − h(ρ),
 * in the closed form of each kind (height-at-radius.ts has the same by radius). One square root a sample at most for
 * the common cases, and one shape of object for all kinds, so that the inner loop stays fast.
 */
export class RadialDepth {
  private readonly kind: Cutter['kind'];
  /** straight: R²; tapered: (r cos a)²; beading: (t/2 + R)². */
  private readonly limit: number = 0;
  /** vee, tapered: rise of the flank over its run; beading: R. */
  private readonly slope: number = 0;
  /** tapered: r; beading: t/2. */
  private readonly small: number = 0;
  /** tapered: r/cos a, where the flank would reach at the height of the nose's centre. */
  private readonly atCentre: number = 0;

  constructor(cutter: Cutter) {
    this.kind = cutter.kind;
    switch (cutter.kind) {
      case 'straight':
        this.limit = (cutter.diameter / 2) ** 2;
        return;
      case 'vee':
        this.slope = 1 / Math.tan(radians(cutter.includedAngle) / 2);
        return;
      case 'tapered': {
        const a = radians(cutter.sideAngle);
        this.small = cutter.tipRadius;
        this.limit = (cutter.tipRadius * Math.cos(a)) ** 2;
        this.slope = 1 / Math.tan(a);
        this.atCentre = cutter.tipRadius / Math.cos(a);
        return;
      }
      case 'beading':
        this.small = cutter.tipFlat / 2;
        this.slope = cutter.profileRadius;
        this.limit = (cutter.tipFlat / 2 + cutter.profileRadius) ** 2;
    }
  }

  /** Depth at squared distance `square` from the axis; 0 or less where the face is left alone. */
  at(square: number, tip: number): number {
    switch (this.kind) {
      case 'straight':
        return square <= this.limit ? tip : 0;
      case 'vee':
        return tip - this.slope * Math.sqrt(square);
      case 'tapered': {
        const r = this.small;
        if (square < this.limit) return tip - square / (r + Math.sqrt(r * r - square));
        return tip - r - (Math.sqrt(square) - this.atCentre) * this.slope;
      }
      case 'beading': {
        if (square > this.limit) return 0;
        const beyond = Math.sqrt(square) - this.small;
        return beyond <= 0 ? tip : tip - Math.sqrt(beyond * (2 * this.slope - beyond));
      }
    }
  }
}
