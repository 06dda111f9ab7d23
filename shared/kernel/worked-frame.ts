import type { Finding } from './checks/finding.ts';
import type { Extents } from './contour/contour.ts';
import type { CornerResidue } from './line-sets/corner-residue.ts';
import type { DadoOutline } from './frame/dado-outline.ts';
import type { FrameContours } from './frame/members.ts';
import type { Face, LineSet } from './line-sets/line-set.ts';
import type { Particulars } from './particulars/particulars.ts';
import type { BlankPlan } from './placing/blank-plan.ts';
import type { Placement } from './placing/placement.ts';

/** One face as it lies on the machine: lines in setup coordinates, pins at 0, 0. */
export interface FaceWork {
  readonly face: Face;
  readonly placement: Placement;
  /** The board as it lies in this setup. */
  readonly board: Extents;
  /** In cutting order. */
  readonly lineSets: readonly LineSet[];
}

/** All lines that follow from a frame's particulars. Where the checks find a stop, lines may be missing. */
export interface DrawnFrame {
  readonly particulars: Particulars;
  readonly contours: FrameContours;
  readonly dados: readonly DadoOutline[];
  readonly blank: BlankPlan;
  readonly back: FaceWork;
  readonly front: FaceWork;
}

/** The lines and what is to be said of them. */
export interface WorkedFrame extends DrawnFrame {
  readonly residues: readonly CornerResidue[];
  /** Stops first, then cautions, then notes. */
  readonly findings: readonly Finding[];
}
