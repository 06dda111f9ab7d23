import { convertLength } from '#shared/kernel/units/convert-length.ts';
import { formatLength, formatWithUnit } from '#shared/kernel/units/format-length.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';

const OTHER: Record<Unit, Unit> = { in: 'mm', mm: 'in' };

/** "33 × 30 1/2 in" */
export const saySize = (width: number, height: number, unit: Unit): string =>
  `${formatLength(width, unit)} × ${formatWithUnit(height, unit)}`;

/** The same size in the other unit. */
export const sayOtherSize = (width: number, height: number, unit: Unit): string =>
  saySize(convertLength(width, unit, OTHER[unit]), convertLength(height, unit, OTHER[unit]), OTHER[unit]);
