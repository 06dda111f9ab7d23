import type { Extents } from '../contour/contour.ts';
import type { FeatureId } from '../frame/members.ts';
import type { Face } from '../line-sets/line-set.ts';

/** stop: may not be released; caution: look before you cut; note: good to know. */
export type FindingLevel = 'stop' | 'caution' | 'note';

export type FindingCode =
  | 'members-do-not-add-up'
  | 'arch-unfit'
  | 'opening-smaller-than-cutter'
  | 'arc-smaller-than-cutter'
  | 'dado-narrower-than-cutter'
  | 'dado-shorter-than-cutter'
  | 'dado-too-deep'
  | 'dado-outside-frame'
  | 'offset-collapses'
  | 'bead-collapses'
  | 'bead-too-deep'
  | 'bead-cutter-differs'
  | 'quirk-narrower-than-cutter'
  | 'vee-over-bead'
  | 'no-face-between'
  | 'quirk-scar'
  | 'thin-under-bead'
  | 'bead-shaved'
  | 'flute-too-short'
  | 'cutter-unfit'
  | 'frame-over-blank'
  | 'blank-over-sheet'
  | 'outline-crosses-itself'
  | 'opening-outside-perimeter'
  | 'openings-overlap'
  | 'thin-wall'
  | 'open-end-inside'
  | 'end-meets-nothing'
  | 'slender-member'
  | 'small-allowance'
  | 'tight-clearance'
  | 'notch-corner'
  | 'corner-residue'
  | 'bead-nub'
  | 'offcut-free'
  | 'size-held';

/** Where a finding points: a feature, or a rectangle in frame view. */
export interface FindingPlace {
  readonly face: Face | 'both';
  readonly features: readonly FeatureId[];
  readonly extents: Extents;
}

export interface Finding {
  readonly code: FindingCode;
  readonly level: FindingLevel;
  /** What was found, with its numbers, in the frame's unit. */
  readonly text: string;
  /** What to change; '' where nothing need be. */
  readonly remedy: string;
  /** The numbers in `text`, unrounded, by name. */
  readonly numbers: Readonly<Record<string, number>>;
  readonly places: readonly FindingPlace[];
  /** Path of the entry to change, such as 'dados.0.depth'. */
  readonly field?: string;
}
