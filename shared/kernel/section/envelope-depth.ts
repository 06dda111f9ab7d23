import { heightAtRadius } from '../cutters/height-at-radius.ts';
import type { SectionPass } from './section-passes.ts';

/** Depth that one pass leaves at y; negative where it leaves the face alone. */
export const passDepthAt = (pass: SectionPass, y: number): number =>
  pass.tipDepth - heightAtRadius(pass.cutter, Math.abs(y - pass.offset));

/**
 * Depth of the true section at y, outward from the opening's edge: the lower envelope of all passes, clipped at the face
 * and at the board's far side. On the opening's side of its axis nothing is left: the offcut has come free.
 */
export function envelopeDepth(passes: readonly SectionPass[], y: number, thickness: number): number {
  let depth = 0;
  for (const pass of passes) {
    if (pass.set === 'OPENING_AXIS' && y <= pass.offset) return thickness;
    depth = Math.max(depth, passDepthAt(pass, y));
  }
  return Math.min(depth, thickness);
}
