import type { Cutter, CutterRole } from '../cutters/cutter.ts';
import { radiusAtHeight } from '../cutters/radius-at-height.ts';
import { beadCutters, quirkOffsets } from '../line-sets/bead-line-sets.ts';
import { veeFloor } from '../line-sets/corner-vee-line-set.ts';
import { beadBase } from '../line-sets/held-depth.ts';
import type { SetName } from '../line-sets/line-set.ts';
import { openingCut } from '../line-sets/opening-cut.ts';
import type { Edge, Particulars } from '../particulars/particulars.ts';

/** One cutter as it stands in the section across an opening's edge. */
export interface SectionPass {
  readonly set: SetName;
  readonly role: CutterRole;
  readonly cutter: Cutter;
  /** Of its axis, outward from the opening's edge (y = 0: the edge in the corners' plane). */
  readonly offset: number;
  /** Of its tip below the face. */
  readonly tipDepth: number;
}

/** A V-cutter as it stands beside an edge on its way into a corner: its flank touches the edge in the corners' plane. */
export function cornerVeePass(p: Particulars, edge: Edge): SectionPass | undefined {
  const { corner } = p.cutters;
  const cut = openingCut(p, edge);
  if (edge.corners !== 'vee' || corner?.kind !== 'vee') return undefined;
  const tipDepth = veeFloor(corner, p.thickness);
  if (tipDepth <= cut.planeDepth) return undefined;
  return {
    set: 'CORNER_VEE',
    role: 'corner',
    cutter: corner,
    offset: -radiusAtHeight(corner, tipDepth - cut.planeDepth),
    tipDepth,
  };
}

/** All cutters that pass an opening's edge, in cutting order, at their full depth. */
export function sectionPasses(p: Particulars, edge: Edge = p.edge): SectionPass[] {
  const cut = openingCut(p, edge);
  const passes: SectionPass[] = [];
  const cutters = beadCutters(p.cutters);
  if (edge.style === 'beaded' && cutters) {
    const { radius } = edge.bead;
    const base = beadBase(edge);
    const { bead, quirk } = cutters;
    passes.push({ set: 'BEAD_INNER', role: 'bead', cutter: bead, offset: -bead.tipFlat / 2, tipDepth: base });
    passes.push({
      set: 'BEAD_OUTER',
      role: 'bead',
      cutter: bead,
      offset: 2 * radius + bead.tipFlat / 2,
      tipDepth: base,
    });
    for (const offset of quirkOffsets(edge.bead, quirk.diameter))
      passes.push({ set: 'QUIRK', role: 'quirk', cutter: quirk, offset, tipDepth: base });
  }
  const cutter = p.cutters.opening;
  passes.push({
    set: 'OPENING_AXIS',
    role: 'opening',
    cutter,
    offset: -radiusAtHeight(cutter, cut.tipDepth - cut.planeDepth),
    tipDepth: cut.tipDepth,
  });
  return passes;
}
