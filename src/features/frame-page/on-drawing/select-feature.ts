import type { Point } from '#shared/kernel/contour/contour.ts';
import type { Member, Opening } from '#shared/kernel/frame/members.ts';
import type { Face } from '#shared/kernel/line-sets/line-set.ts';
import type { Desk } from '../model/desk.ts';
import type { Selection } from '../model/selection.ts';

const middle = ({ extents: e }: Opening | Member): Point => ({ x: (e.minX + e.maxX) / 2, y: (e.minY + e.maxY) / 2 });

const isMember = (feature: Opening | Member): feature is Member => 'kind' in feature;

/** A selection of an opening or member as picked on a face, at its middle unless a place in it is given. */
export const selectionOf = (
  feature: Opening | Member,
  face: Face,
  open: boolean,
  at: Point = middle(feature),
): Selection => ({
  id: feature.id,
  path: isMember(feature) ? null : (feature.path ?? null),
  face,
  at,
  open,
  problem: '',
});

/** Begins walking the openings and members at the first opening, or ends it. Measuring ends: the arrow keys go one way or the other. */
export function toggleWalking({ selection, measuring, editor }: Desk): void {
  const { openings } = editor.store.get().drawn.contours;
  const [first] = openings;
  if (selection.get() !== null) return selection.set(null);
  if (first === undefined) return;
  measuring.set(null);
  selection.set(selectionOf(first, 'front', false));
}
