import type { Edge } from '../particulars/particulars.ts';

/** z0: depth below the face where an opening's entered size is true. */
export function heldDepth(edge: Edge, thickness: number): number {
  const at = edge.sizeHeldAt ?? (edge.style === 'beaded' ? 'bead base' : 'face');
  if (at === 'face') return 0;
  if (at === 'back') return thickness;
  if (edge.style !== 'beaded') throw new RangeError('size held at the bead base: got a square edge, takes a beaded one');
  return cornerDepth(edge);
}

/** zc: depth of the plane in which corners are lifted to be square: the face, or a bead's base. */
export const cornerDepth = (edge: Edge): number => (edge.style === 'beaded' ? edge.bead.radius + edge.bead.drop : 0);
