import type { Edge, Particulars } from '../particulars/particulars.ts';
import { beadBase } from '../line-sets/held-depth.ts';
import { radiusAtHeight } from '../cutters/radius-at-height.ts';
import type { SectionPass } from './section-passes.ts';

/** What of the section is shown: y outward from the opening's edge, depths below the face. Frame's unit. */
export interface SectionWindow {
  readonly minY: number;
  readonly maxY: number;
  readonly top: number;
  readonly bottom: number;
}

/** The part of a section worth drawing: a beaded edge down to a little below its base, a square one through the whole board. */
export function sectionWindow(p: Particulars, edge: Edge, passes: readonly SectionPass[]): SectionWindow {
  const opening = passes.find((pass) => pass.set === 'OPENING_AXIS')!;
  const reach = radiusAtHeight(opening.cutter, opening.tipDepth);
  if (edge.style === 'square') {
    return {
      minY: opening.offset - 1.3 * reach,
      maxY: Math.max(3 * reach, p.thickness * 0.4),
      top: -0.12 * p.thickness,
      bottom: Math.max(opening.tipDepth, p.thickness) * 1.06,
    };
  }
  const { radius: R, quirk: q } = edge.bead;
  const scarEnd = Math.max(
    ...passes.map((pass) => (pass.role === 'bead' ? pass.offset + radiusAtHeight(pass.cutter, pass.tipDepth) : 0)),
  );
  const maxY = Math.max(2 * R + q, scarEnd) + 0.8 * R;
  return {
    minY: Math.max(opening.offset - 0.6 * reach, -1.6 * R - 0.6 * reach),
    maxY,
    top: -0.5 * R,
    bottom: beadBase(edge) + 0.6 * R,
  };
}
