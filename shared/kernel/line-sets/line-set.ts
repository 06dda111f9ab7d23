import type { Contour, Point3 } from '../contour/contour.ts';
import type { CutterRole } from '../cutters/cutter.ts';
import type { FeatureId } from '../frame/members.ts';

export type Face = 'back' | 'front';

/** Names of line sets, in cutting order; the default layer is the face and this. */
export type SetName =
  | 'DADO'
  | 'SQUARING'
  | 'BLANK'
  | 'BEAD_INNER'
  | 'BEAD_OUTER'
  | 'QUIRK'
  | 'QUIRK_CORNER'
  | 'OPENING'
  | 'OPENING_AXIS'
  | 'CORNER_LIFT'
  | 'CORNER_VEE'
  | 'PERIMETER';

/** Where the cutter runs beside a line. 'waste': at the right of the direction of an open line, outside a closed one. */
export type CutterSide = 'inside' | 'outside' | 'on' | 'waste' | 'none';

/** One line of a line set: a contour in the plane, or a climbing path in space (z negative below the face). */
export type Shape =
  | { readonly kind: 'contour'; readonly contour: Contour; readonly of: readonly FeatureId[] }
  | { readonly kind: 'climb'; readonly points: readonly Point3[]; readonly of: readonly FeatureId[] };

/** All lines for one cutter on one face, on one DXF layer. */
export interface LineSet {
  readonly face: Face;
  readonly set: SetName;
  /** Told apart from others of the same name, when there are several: dados of several depths, 'D0250'. '' otherwise. */
  readonly variant: string;
  /** null: not cut (a blank). */
  readonly cutter: CutterRole | null;
  readonly side: CutterSide;
  /** Tip depth below the face that lies up, positive; 0 when not cut. */
  readonly depth: number;
  /** Tip depths of the passes, the last one is `depth`; empty when not cut. */
  readonly passes: readonly number[];
  readonly shapes: readonly Shape[];
}

/** Stable key of a line set within a frame, for switches and colours: 'front/OPENING_AXIS', 'back/DADO_D0250'. */
export const lineSetKey = (s: Pick<LineSet, 'face' | 'set' | 'variant'>): string =>
  `${s.face}/${s.set}${s.variant ? `_${s.variant}` : ''}`;
