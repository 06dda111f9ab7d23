import { radiusAtHeight } from '../cutters/radius-at-height.ts';
import { edgeOfOpening } from '../line-sets/held-depth.ts';
import { lineSetKey, type Face, type LineSet } from '../line-sets/line-set.ts';
import { openingCut } from '../line-sets/opening-cut.ts';
import type { Particulars } from '../particulars/particulars.ts';
import type { FileProfile } from '../profiles/file-profile.ts';
import { nameLayers } from '../profiles/name-layers.ts';
import type { DrawnFrame } from '../worked-frame.ts';
import type { LayerCut } from './face-cut.ts';

/** How far beside the lines a cutter runs: its radius, and for the entered size of openings its radius where that size is true. */
function besideOf(p: Particulars, { set, variant, side, cutter: role, depth }: LineSet): number {
  if (side === 'on' || side === 'none' || role === null) return 0;
  if (set === 'OPENING') return openingCut(p, edgeOfOpening(p.edge, { square: variant !== '' })).axisOffset;
  return radiusAtHeight(p.cutters[role]!, depth);
}

/**
 * The table that goes with one face's drawing, as its setup sheet tells it: layer, cutter, side, depth, in cutting order.
 * Layers that are not cut are left out, and an OPENING whose OPENING_AXIS is there too: cut one, not both.
 * Throws DrawingRefused as nameLayers does.
 */
export function layerCuts(worked: DrawnFrame, face: Face, profile: FileProfile): LayerCut[] {
  const layers = nameLayers(worked, profile);
  const carried = worked[face].lineSets.filter((s) => layers.has(lineSetKey(s)));
  const hasAxis = (entered: LineSet) => carried.some((s) => s.set === 'OPENING_AXIS' && s.variant === entered.variant);
  const cuts: LayerCut[] = [];
  for (const set of carried) {
    const cutter = set.cutter === null ? undefined : worked.particulars.cutters[set.cutter];
    if (cutter === undefined || (set.set === 'OPENING' && hasAxis(set))) continue;
    cuts.push({
      key: lineSetKey(set),
      layer: layers.get(lineSetKey(set))!.name,
      set: set.set,
      order: cuts.length,
      cutter,
      side: set.side,
      depth: set.depth,
      beside: besideOf(worked.particulars, set),
      pocket: set.set === 'DADO',
    });
  }
  return cuts;
}
