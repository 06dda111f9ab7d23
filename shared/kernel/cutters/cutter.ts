/**
 * Cutter shapes, each given by its radius ρ at height h above the tip (radius-at-height.ts).
 * Lengths in the frame's unit, angles in degrees; maxPass is the deepest step of one pass.
 */
interface CutterCommon {
  /** Length of the cutting edge from the tip up. */
  readonly fluteLength: number;
  /** Deepest step of one pass; the whole depth at once when absent. */
  readonly maxPass?: number;
  /** What the shop calls it; printed on the setup sheet. */
  readonly name?: string;
  /** Place in the machine's changer. */
  readonly number?: number;
}

export interface StraightCutter extends CutterCommon {
  readonly kind: 'straight';
  readonly diameter: number;
}

export interface VeeCutter extends CutterCommon {
  readonly kind: 'vee';
  /** Included angle β, degrees. */
  readonly includedAngle: number;
}

export interface TaperedCutter extends CutterCommon {
  readonly kind: 'tapered';
  readonly tipRadius: number;
  /** Angle a of one side, degrees. */
  readonly sideAngle: number;
}

export interface BeadingCutter extends CutterCommon {
  readonly kind: 'beading';
  readonly profileRadius: number;
  readonly tipFlat: number;
}

export type Cutter = StraightCutter | VeeCutter | TaperedCutter | BeadingCutter;
export type CutterKind = Cutter['kind'];

/** What a cutter does on a frame; the keys of `cutters` in a frame file. */
export type CutterRole = 'dado' | 'squaring' | 'opening' | 'perimeter' | 'bead' | 'quirk' | 'corner';
