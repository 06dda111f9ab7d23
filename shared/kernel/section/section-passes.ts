import type { Cutter, CutterRole } from '../cutters/cutter.ts';
import { radiusAtHeight } from '../cutters/radius-at-height.ts';
import { beadCutters, quirkOffsets } from '../line-sets/bead-line-sets.ts';
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
