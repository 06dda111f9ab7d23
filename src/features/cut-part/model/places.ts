import type { Extents, Point } from '#shared/kernel/contour/contour.ts';
import type { Opening } from '#shared/kernel/frame/members.ts';
import { insideCorners } from '#shared/kernel/line-sets/inside-corners.ts';
import { convertLength } from '#shared/kernel/units/convert-length.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import type { DrawnFrame } from '#shared/kernel/worked-frame.ts';

/** A place to look at: the whole board, or a region of it closer. */
export interface Place {
  readonly key: string;
  readonly words: string;
  /** null: the whole board. */
  readonly region: Extents | null;
}

/** Side of the square looked at about a corner: at the finest cell it fills a raster of 513. */
const CORNER_MM = 25.5;
/** Board shown about an opening. */
const MARGIN_MM = 25;

export const WHOLE: Place = { key: 'whole', words: 'Whole board', region: null };

/** The square about a point that is looked at finest. */
export function regionAbout({ x, y }: Point, unit: Unit): Extents {
  const half = convertLength(CORNER_MM, 'mm', unit) / 2;
  return { minX: x - half, minY: y - half, maxX: x + half, maxY: y + half };
}

/** "lower left" and the like, where an upright opening has its four corners; else its place in the row, from 1. */
function cornerWords({ extents }: Opening, corners: readonly Point[]): string[] {
  const middle = { x: (extents.minX + extents.maxX) / 2, y: (extents.minY + extents.maxY) / 2 };
  const names = corners.map((p) => `${p.y < middle.y ? 'lower' : 'upper'} ${p.x < middle.x ? 'left' : 'right'} corner`);
  return new Set(names).size === names.length ? names : corners.map((_, i) => `corner ${i + 1}`);
}

function placesOf(opening: Opening, unit: Unit): Place[] {
  const margin = convertLength(MARGIN_MM, 'mm', unit);
  const { minX, minY, maxX, maxY } = opening.extents;
  const corners = insideCorners(opening.contour).map(({ after }) => after.a);
  const words = cornerWords(opening, corners);
  return [
    {
      key: opening.id,
      words: `Opening ${opening.label}`,
      region: { minX: minX - margin, minY: minY - margin, maxX: maxX + margin, maxY: maxY + margin },
    },
    ...corners.map((at, i) => ({
      key: `${opening.id}-${i}`,
      words: `Opening ${opening.label}, ${words[i]}`,
      region: regionAbout(at, unit),
    })),
  ];
}

/** The whole board, each opening and each of its inside corners. */
export function listPlaces({ contours, particulars }: DrawnFrame): Place[] {
  return [WHOLE, ...contours.openings.flatMap((opening) => placesOf(opening, particulars.unit))];
}
