import type { Point } from '#shared/kernel/contour/contour.ts';
import { formatOther, formatWithUnit } from '#shared/kernel/units/format-length.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';

const both = (value: number, unit: Unit): string => `${formatWithUnit(value, unit)} (${formatOther(value, unit)})`;

/** Distance between two places, straight, across and up, in both units. */
export function measureWords(a: Point, b: Point, unit: Unit): string {
  const dx = Math.abs(b.x - a.x);
  const dy = Math.abs(b.y - a.y);
  return `Distance ${both(Math.hypot(dx, dy), unit)}; across ${both(dx, unit)}; up ${both(dy, unit)}`;
}
