import type { Point } from '#shared/kernel/contour/contour.ts';
import type { ComparedState } from '#shared/kernel/compare/compared-state.ts';
import type { Face } from '#shared/kernel/line-sets/line-set.ts';

/** Room around both frames, as a share of the longer side. */
const MARGIN = 0.04;

/** Frame view to SVG, which has Y down. */
export interface PictureBox {
  readonly viewBox: string;
  readonly transform: string;
  readonly at: (p: Point) => Point;
  readonly textSize: number;
}

/** A box that holds both states of a face. The back is seen as it lies when the board is turned over as it is turned in the newer state. */
export function pictureBox(before: ComparedState, after: ComparedState, face: Face): PictureBox {
  const width = Math.max(before.width, after.width);
  const height = Math.max(before.height, after.height);
  const margin = MARGIN * Math.max(width, height);
  const sx = face === 'back' && after.flip === 'side-to-side' ? -1 : 1;
  const sy = face === 'back' && after.flip === 'end-over-end' ? 1 : -1;
  const [left, top] = [sx === 1 ? 0 : -width, sy === 1 ? 0 : -height];
  return {
    viewBox: [left - margin, top - margin, width + 2 * margin, height + 2 * margin].join(' '),
    transform: `scale(${sx},${sy})`,
    at: ({ x, y }) => ({ x: sx * x, y: sy * y }),
    textSize: margin * 0.75,
  };
}
