import type { Cutter } from '../cutters/cutter.ts';
import type { DrawingLayer } from '../drawing/drawing.ts';
import { lineSetKey, type Face, type LineSet } from '../line-sets/line-set.ts';
import { convertLength } from '../units/convert-length.ts';
import type { DrawnFrame } from '../worked-frame.ts';
import { carriedLineSets } from './carried-line-sets.ts';
import { LABELS, layerColour } from './default-line-sets.ts';
import type { FileProfile } from './file-profile.ts';
import { fileUnit } from './file-unit.ts';
import { refuseClash } from './layer-clash.ts';
import { depthDigits, layerName } from './layer-name.ts';

/** Key of a face's label layer in the map that nameLayers returns. */
export const labelsKey = (face: Face): string => `${face}/${LABELS}`;

/** What {cutter} stands for: the cutter's name, else T and its number, else its task on the frame. */
function cutterWord(worked: DrawnFrame, { cutter: role }: LineSet): string {
  if (role === null) return 'none';
  const cutter: Cutter | undefined = worked.particulars.cutters[role];
  return cutter?.name ?? (cutter?.number === undefined ? role : `T${cutter.number}`);
}

/**
 * The layer of each line set that the profile carries, by lineSetKey, back before front, in cutting order; with
 * labels also 'back/LABELS' and 'front/LABELS'. A line set that is not in the map is not in the files.
 * Throws DrawingRefused (LayerClash) when two sets of this frame would get one name, and for a template that is not one.
 */
export function nameLayers(worked: DrawnFrame, profile: FileProfile): Map<string, DrawingLayer> {
  const drawn = worked.particulars.unit;
  const unit = fileUnit(profile, drawn);
  const layers: { key: string; name: string; colour: number }[] = [];
  for (const face of ['back', 'front'] as const) {
    for (const lineSet of carriedLineSets(worked, face, profile)) {
      const set = lineSet.variant === '' ? lineSet.set : `${lineSet.set}_${lineSet.variant}`;
      const depth = depthDigits(convertLength(lineSet.depth, drawn, unit), unit);
      const name = layerName(profile.layerTemplate, { face, set, cutter: cutterWord(worked, lineSet), depth });
      layers.push({ key: lineSetKey(lineSet), name, colour: layerColour(lineSet) });
    }
    if (profile.labels) {
      const name = layerName(profile.layerTemplate, { face, set: LABELS, cutter: 'none', depth: depthDigits(0, unit) });
      layers.push({ key: labelsKey(face), name, colour: layerColour({ face, set: LABELS }) });
    }
  }
  refuseClash(layers);
  return new Map(layers.map(({ key, name, colour }) => [key, { name, colour }]));
}
