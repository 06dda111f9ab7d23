import type { BeadedEdge, Edge, SquareEdge } from '../particulars/particulars.ts';

/** The edge of one opening: a frame's edge, or the square edge that an opening keeps in a beaded frame (true at the face, or at the back when the frame's sizes are). */
export const edgeOfOpening = (edge: Edge, opening: { readonly square: boolean }): Edge =>
  edge.style === 'beaded' && opening.square
    ? ({
        style: 'square',
        sizeHeldAt: edge.sizeHeldAt === 'back' ? 'back' : 'face',
        corners: edge.corners,
      } satisfies SquareEdge)
    : edge;

/** Depth of a bead's base below the face, e + R: all bead lines lie there. */
export const beadBase = ({ bead }: BeadedEdge): number => bead.radius + bead.drop;

/** z0: depth below the face where an opening's entered size is true. */
export function heldDepth(edge: Edge, thickness: number): number {
  const at = edge.sizeHeldAt ?? 'bead base';
  if (at === 'face') return 0;
  if (at === 'back') return thickness;
  if (edge.style !== 'beaded')
    throw new RangeError('size held at the bead base: got a square edge, takes a beaded one');
  return beadBase(edge);
}

/** zc: depth of the plane in which corners are lifted to be square: the face, or a bead's base. */
export const cornerDepth = (edge: Edge): number => (edge.style === 'beaded' ? beadBase(edge) : 0);
