import type { DadoOutline } from '../frame/dado-outline.ts';
import type { FrameContours, Opening } from '../frame/members.ts';
import type { Face } from '../line-sets/line-set.ts';
import type { FindingPlace } from './finding.ts';

/** A finding about the frame as a whole. */
export const wholeFrame = (c: FrameContours, face: Face | 'both' = 'both'): FindingPlace => ({
  face,
  features: ['perimeter'],
  extents: { minX: 0, minY: 0, maxX: c.width, maxY: c.height },
});

export const atOpening = (o: Opening, face: Face | 'both' = 'front'): FindingPlace => ({
  face,
  features: [o.id],
  extents: o.extents,
});

export const atDado = (d: DadoOutline): FindingPlace => ({ face: 'back', features: [d.id], extents: d.extents });
