import type { Opening } from '#shared/kernel/frame/members.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { readField } from '#shared/kernel/particulars/read-field.ts';
import { setField } from '#shared/kernel/particulars/set-field.ts';

/** An opening: the path of its part in the layout, or its place (from 0) among those of a traced outline. */
export type OpeningPlace = string | number;

/** Place of a traced opening among those entered: its id counts them, also where one that crosses itself is left out of the drawing. */
export const tracedPlace = ({ id }: Opening): number => Number(id.slice('opening-'.length));

/** Whether an opening keeps a square edge in a frame with beaded edges. */
export function keepsSquareEdge(particulars: Particulars, place: OpeningPlace): boolean {
  const { outline } = particulars;
  if (typeof place === 'string') return readField(particulars, `${place}.opening.edge`) === 'square';
  return outline.kind === 'traced' && (outline.squareOpenings?.includes(place) ?? false);
}

/** The particulars where an opening keeps a square edge, or has a bead as the others. Throws when there is no such opening. */
export function setSquareEdge(particulars: Particulars, place: OpeningPlace, square: boolean): Particulars {
  if (typeof place === 'string') return setField(particulars, `${place}.opening.edge`, square ? 'square' : undefined);
  const { outline } = particulars;
  if (outline.kind !== 'traced' || outline.openings[place] === undefined)
    throw new Error(`no traced opening at ${place}`);
  const others = (outline.squareOpenings ?? []).filter((i) => i !== place);
  const all = square ? [...others, place].toSorted((a, b) => a - b) : others;
  return setField(particulars, 'outline.squareOpenings', all.length > 0 ? all : undefined);
}
