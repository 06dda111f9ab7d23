import { heightAtRadius } from '../cutters/height-at-radius.ts';
import { radiusAtHeight } from '../cutters/radius-at-height.ts';
import { beadBase } from '../line-sets/held-depth.ts';
import { openingCut } from '../line-sets/opening-cut.ts';
import type { Edge, Particulars } from '../particulars/particulars.ts';
import { intendedDepth } from '../section/intended-depth.ts';

/** The intended shape across an edge, over s: how far a place lies outside the edge's line, mitred at corners. */
export interface EdgeSection {
  /** Intended depth below the face; the thickness where nothing is to be left. */
  readonly depthAt: (s: number) => number;
  /** Places s at which the intended surface passes depth z, from 0 to the thickness. */
  readonly wallsAt: (z: number) => readonly number[];
  /** The depth is the same everywhere nearer the middle than the first, and everywhere further out than the second. */
  readonly from: number;
  readonly to: number;
}

/**
 * The edge of an opening as it is entered: its wall as upright as the opening cutter's flank, true to size at the held
 * depth, and for a beaded edge the bead and quirk of the section outside it.
 */
export function openingSection(p: Particulars, edge: Edge): EdgeSection {
  const { tipDepth, axisOffset, atFace, atBack, atPlane } = openingCut(p, edge);
  const cutter = p.cutters.opening;
  const { thickness } = p;
  const wallAt = (z: number) => radiusAtHeight(cutter, tipDepth - z) - axisOffset;
  const wallDepth = (s: number) =>
    s <= -axisOffset ? thickness : Math.min(thickness, Math.max(0, tipDepth - heightAtRadius(cutter, s + axisOffset)));
  if (edge.style === 'square') return { depthAt: wallDepth, wallsAt: (z) => [wallAt(z)], from: atBack, to: atFace };

  const { radius: R, drop: e, quirk: q } = edge.bead;
  const base = beadBase(edge);
  const wallsAt = (z: number): number[] => {
    if (z >= base) return [wallAt(z)];
    const outer = atPlane + 2 * R + q;
    if (z < e) return [outer];
    const half = Math.sqrt(Math.max(0, R * R - (base - z) ** 2));
    return [atPlane + R - half, atPlane + R + half, outer];
  };
  return {
    depthAt: (s) => (s < atPlane ? Math.max(base, wallDepth(s)) : intendedDepth(edge.bead, s - atPlane)),
    wallsAt,
    from: Math.min(atBack, atPlane),
    to: atPlane + 2 * R + q,
  };
}

/** A dado: a flat floor and upright sides, corners as sharp as its outline's. */
export const dadoSection = (depth: number): EdgeSection => ({
  depthAt: (s) => (s <= 0 ? depth : 0),
  wallsAt: (z) => (z <= depth ? [0] : []),
  from: 0,
  to: 0,
});

/** The outer edge: upright, with nothing beyond it. */
export const perimeterSection = (thickness: number): EdgeSection => ({
  depthAt: (s) => (s >= 0 ? thickness : 0),
  wallsAt: () => [0],
  from: 0,
  to: 0,
});
