import type { Cutter } from '../cutters/cutter.ts';
import { radiusAtHeight } from '../cutters/radius-at-height.ts';
import { heldDepth } from '../line-sets/held-depth.ts';
import type { WorkedFrame } from '../worked-frame.ts';

/** How the opening cutter makes the entered size true. Frame's unit. */
export interface OpeningCut {
  readonly cutter: Cutter;
  /** z0: depth below the face where the entered size is true. */
  readonly heldAt: number;
  /** D: how deep the tip goes. */
  readonly tipDepth: number;
  /** ρ(D − z0): from the entered line inwards to the cutter's axis. */
  readonly axisOffset: number;
  /** By how much an opening is smaller (positive) or larger at the back than at the face, a side. */
  readonly smallerAtBack: number;
}

/** Undefined when no opening is cut. Tip depths are those of the line sets, so the sheet says what the files say. */
export function openingCut(worked: WorkedFrame): OpeningCut | undefined {
  const { edge, thickness, cutters } = worked.particulars;
  const tipDepth = worked.front.lineSets.find((s) => s.set === 'OPENING' && s.shapes.length > 0)?.depth;
  if (tipDepth === undefined) return undefined;
  const cutter = cutters.opening;
  const heldAt = heldDepth(edge, thickness);
  return {
    cutter,
    heldAt,
    tipDepth,
    axisOffset: radiusAtHeight(cutter, tipDepth - heldAt),
    smallerAtBack: radiusAtHeight(cutter, tipDepth) - radiusAtHeight(cutter, tipDepth - thickness),
  };
}
