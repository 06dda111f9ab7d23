import type { Extents, Point } from '../contour/contour.ts';
import type { Face } from '../line-sets/line-set.ts';
import { placeExtents } from '../placing/place.ts';
import type { Unit } from '../units/unit.ts';
import type { DrawnFrame } from '../worked-frame.ts';

/** A word on a face: `at` is the left end of its base line in the setup, `height` that of a capital. Unit of the frame. */
export interface PlacedLabel {
  readonly at: Point;
  readonly height: number;
  readonly text: string;
}

const TEXT_HEIGHT: Record<Unit, number> = { in: 0.5, mm: 12 };
/** Width of a letter over its height, near enough for any font to find the middle. */
const LETTER = 0.8;

/** Opening labels (front) or part names (back), each about the middle of its opening or dado. */
export function placeLabels(worked: DrawnFrame, face: Face): PlacedLabel[] {
  const named: { text: string; extents: Extents }[] =
    face === 'front'
      ? worked.contours.openings.map(({ label, extents }) => ({ text: label, extents }))
      : worked.dados.map(({ part, extents }) => ({ text: part, extents }));
  return named
    .filter(({ text }) => text !== '')
    .map(({ text, extents }) => {
      const { minX, minY, maxX, maxY } = placeExtents(worked[face].placement, extents);
      const height = Math.min(TEXT_HEIGHT[worked.particulars.unit], (maxX - minX) / 2, (maxY - minY) / 2);
      const width = text.length * LETTER * height;
      return { text, height, at: { x: (minX + maxX - width) / 2, y: (minY + maxY - height) / 2 } };
    });
}
