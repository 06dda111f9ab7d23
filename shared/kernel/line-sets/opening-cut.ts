import type { Cutter } from '../cutters/cutter.ts';
import { canLift } from '../cutters/height-at-radius.ts';
import { radiusAtHeight } from '../cutters/radius-at-height.ts';
import { throughDepth } from '../cutters/tip-depth.ts';
import type { Edge, Particulars } from '../particulars/particulars.ts';
import { cornerDepth, heldDepth } from './held-depth.ts';

/** The numbers of the cut through an opening's edge; lengths below the face, radii about the axis. */
export interface OpeningCut {
  /** D: depth of the tip. */
  readonly tipDepth: number;
  /** z0: where the entered size is true. */
  readonly heldDepth: number;
  /** zc: the plane in which lifted corners are square. */
  readonly planeDepth: number;
  /** ρ(D − z0): how far the axis runs inside the entered size. */
  readonly axisOffset: number;
  /** How far the edge lies outside the entered size at the face, and at the back (negative: inside). */
  readonly atFace: number;
  readonly atBack: number;
  /** The same in the corners' plane. */
  readonly atPlane: number;
  /** Depth of the tip where its climb into a corner ends; undefined when it does not climb. */
  readonly climbEnd: number | undefined;
}

/**
 * Where a climb into a corner ends. In a square edge it is the corner's plane itself. Above a bead's base the bead stands
 * beside the corner: there a round nose, wider above its tip, would cut into it, so that a tapered cutter climbs only as
 * long as its flank passes the base, to h = r(1 − sin a); a V is no wider above, whatever its height.
 */
function climbEnd(cutter: Cutter, edge: Edge, plane: number): number | undefined {
  if (!canLift(cutter) || edge.corners === 'round') return undefined;
  if (edge.style === 'square' || cutter.kind !== 'tapered') return plane;
  return plane + cutter.tipRadius * (1 - Math.sin((cutter.sideAngle * Math.PI) / 180));
}

/** Depths and offsets that follow from an edge (the frame's, unless another is given), the board and the opening cutter. */
export function openingCut(
  { edge: frameEdge, thickness, cutters, setup }: Particulars,
  edge: Edge = frameEdge,
): OpeningCut {
  const cutter = cutters.opening;
  const tipDepth = throughDepth(cutter, thickness, setup.spoilboard);
  const held = heldDepth(edge, thickness);
  const plane = cornerDepth(edge);
  const axisOffset = radiusAtHeight(cutter, tipDepth - held);
  const widerAt = (depth: number) => radiusAtHeight(cutter, tipDepth - depth) - axisOffset;
  return {
    tipDepth,
    heldDepth: held,
    planeDepth: plane,
    axisOffset,
    atFace: widerAt(0),
    atBack: widerAt(thickness),
    atPlane: widerAt(plane),
    climbEnd: climbEnd(cutter, edge, plane),
  };
}
