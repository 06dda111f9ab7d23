import { MM_PER_INCH, type Unit } from '../units/unit.ts';

/**
 * Denominators of the scales drawings are made to, within one decade or (inches) one run.
 * ISO 5455 recommends 1, 2, 5, 10, 20, 50 … and lets intermediate ones stand where those would waste the sheet;
 * the ones between are, for millimetres, those that GB/T 14690 lists (from memory) and 8, because from 6 to 10 a drawing
 * would lose two fifths of its size at one step; for inches those an inch rule reads directly: 4, 8, 16, 32 (quarters to
 * thirty-seconds) and 6, 12, 24 (feet in inches).
 */
const IN_MILLIMETRES = [1, 1.5, 2, 2.5, 3, 4, 5, 6, 8];
const IN_INCHES = [1, 2, 3, 4, 5, 6, 8, 10, 12, 16, 20, 24, 32, 40, 48, 50, 64, 80];

/** The scale's denominators in rising order, without end. */
function* denominators(unit: Unit): Generator<number> {
  const series = unit === 'mm' ? IN_MILLIMETRES : IN_INCHES;
  for (let decade = 1; ; decade *= unit === 'mm' ? 10 : 100) for (const n of series) yield n * decade;
}

export const millimetresPerUnit = (unit: Unit): number => (unit === 'in' ? MM_PER_INCH : 1);

/**
 * Largest standard scale, as a denominator, at which `width` × `height` (in `unit`) stays within `room` (millimetres of paper).
 * Throws when the room is nothing or a size is not finite.
 */
export function chooseScale(
  width: number,
  height: number,
  unit: Unit,
  room: { readonly width: number; readonly height: number },
): number {
  if (!(room.width > 0 && room.height > 0))
    throw new RangeError(`room for a drawing: got ${room.width} × ${room.height} mm, takes more than 0`);
  if (!Number.isFinite(width) || !Number.isFinite(height))
    throw new RangeError(`size of a drawing: got ${width} × ${height}, takes finite lengths`);
  const mm = millimetresPerUnit(unit);
  for (const n of denominators(unit)) if ((width * mm) / n <= room.width && (height * mm) / n <= room.height) return n;
  throw new RangeError('no scale');
}

/** A scale in words: "1 : 8". */
export const scaleText = (denominator: number): string => `1 : ${denominator}`;
