import type { Contour, Extents } from '../contour/contour.ts';
import { contourExtents } from '../contour/contour-extents.ts';
import { rectangle } from '../contour/make-contour.ts';
import type { FeatureId } from '../frame/members.ts';
import { edgeOfOpening } from '../line-sets/held-depth.ts';
import type { Face } from '../line-sets/line-set.ts';
import type { DrawnFrame } from '../worked-frame.ts';
import { dadoSection, openingSection, perimeterSection, type EdgeSection } from './edge-section.ts';
import { InsideRows } from './inside-rows.ts';
import { MitredDistance } from './mitred-distance.ts';

/** A thing that is meant to be on a face, from the particulars alone; frame view. */
export interface IntendedFeature {
  readonly id: FeatureId;
  readonly section: EdgeSection;
  readonly extents: Extents;
  readonly distance: MitredDistance;
  readonly inside: InsideRows;
  /** Straight-line distance from its line within which its depth changes. */
  readonly reach: number;
}

function makeFeature(id: FeatureId, contour: Contour, section: EdgeSection): IntendedFeature {
  const distance = new MitredDistance(contour);
  const reach = distance.reach(Math.max(Math.abs(section.from), Math.abs(section.to)));
  return { id, section, extents: contourExtents(contour), distance, inside: new InsideRows([contour]), reach };
}

/** What is meant to be on a face: openings with their edges and the perimeter on the front, dados with sharp corners on the back. */
export function intendedFeatures({ particulars: p, contours, dados }: DrawnFrame, face: Face): IntendedFeature[] {
  if (face === 'back') return dados.map((d) => makeFeature(d.id, rectangle(d.extents), dadoSection(d.depth)));
  return [
    ...contours.openings.map((o) => makeFeature(o.id, o.contour, openingSection(p, edgeOfOpening(p.edge, o)))),
    makeFeature('perimeter', contours.perimeter, perimeterSection(p.thickness)),
  ];
}
