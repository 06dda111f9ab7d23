import type { Particulars } from '../particulars/particulars.ts';
import type { BlankPlan } from './blank-plan.ts';

/**
 * The blank and how both setups lie on it, for a frame W × H with allowance k and trim t. The pins are at the machine's
 * lower left in both. Rough blank, unless given: (W + 2k + 2t) × (H + 2k + 2t).
 */
export function planBlank(
  width: number,
  height: number,
  setup: Particulars['setup'],
  given: Particulars['blank'],
): BlankPlan {
  const { flip, allowance: k, trim: t, squaring } = setup;
  const roughWidth = given?.width ?? width + 2 * k + 2 * t;
  const roughHeight = given?.height ?? height + 2 * k + 2 * t;
  const squared =
    squaring === 'all-edges' ? { x: width + 2 * k, y: height + 2 * k } : { x: roughWidth - t, y: roughHeight - t };
  const sideToSide = flip === 'side-to-side';
  return {
    flip,
    given: given !== undefined,
    rough: { minX: 0, minY: 0, maxX: roughWidth, maxY: roughHeight },
    squared: { minX: 0, minY: 0, maxX: squared.x, maxY: squared.y },
    squaredCorner: sideToSide ? { x: roughWidth - t, y: t } : { x: t, y: roughHeight - t },
    squaredEdges: sideToSide ? ['right', 'bottom'] : ['left', 'top'],
    // Frame view → front setup is xf = x + k, yf = y + k; the back is the front turned over about the fold.
    front: { sx: 1, sy: 1, dx: k, dy: k },
    back: sideToSide
      ? { sx: -1, sy: 1, dx: roughWidth - t - k, dy: t + k }
      : { sx: 1, sy: -1, dx: t + k, dy: roughHeight - t - k },
  };
}
