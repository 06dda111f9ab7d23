import type { FeatureId } from '../frame/members.ts';

/** What a round cutter leaves in the inside corners of an opening. */
export interface CornerResidue {
  readonly opening: FeatureId;
  /** Corner's inside angle, radians. */
  readonly angle: number;
  readonly place: { readonly x: number; readonly y: number };
  /** How often this residue occurs in the opening (corners of the same angle are listed once). */
  readonly count: number;
  /** At the face, or a bead's base, and at three depths below it: radius left by lifting into the corner, and without. */
  readonly levels: readonly {
    readonly depth: number;
    readonly lifted: { readonly radius: number; readonly diagonal: number };
    readonly unlifted: { readonly radius: number; readonly diagonal: number };
    /** On the diagonal once a V-cutter has followed; undefined where none does. */
    readonly followed: number | undefined;
  }[];
}
