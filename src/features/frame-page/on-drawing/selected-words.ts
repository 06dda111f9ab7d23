import { formatLength, formatWithUnit } from '#shared/kernel/units/format-length.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import type { Selected } from '../model/selection.ts';

/** What a selected opening or member is called. */
export const selectedName = ({ kind, feature }: Selected): string =>
  kind === 'opening' ? `Opening ${feature.label}` : feature.label;

/** Its numbers: an opening's width and height, a member's width and length. */
export function selectedSize({ feature }: Selected, unit: Unit): string {
  if ('height' in feature) return `${formatLength(feature.width, unit)} × ${formatLength(feature.height, unit)}`;
  return `${formatLength(feature.width, unit)} × ${formatWithUnit(feature.length, unit)} long`;
}

/** What the keys do while something is selected. */
export const SELECTED_KEYS =
  'Enter: edit, C: columns, R: rows, L: label, S: size, A: arch, Del: remove, arrows: to the neighbour, Esc: leave';
