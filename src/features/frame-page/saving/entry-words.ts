import type { LayoutPart } from '#shared/kernel/particulars/particulars.ts';
import { openingParts } from '#shared/kernel/particulars/layout-parts.ts';
import { formatLength } from '#shared/kernel/units/format-length.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';

const isPart = (value: object): value is LayoutPart => 'opening' in value || 'columns' in value || 'rows' in value;

/** Numbers that are no lengths. */
const NO_LENGTH = /(sideAngle|includedAngle|number)$/;

/** What stands in an entry, in a few words, for telling two drafts apart. */
export function entryWords(path: string, value: unknown, unit: Unit): string {
  if (value === undefined) return 'nothing';
  if (typeof value === 'number') return NO_LENGTH.test(path) ? String(value) : formatLength(value, unit);
  if (typeof value === 'string') return value;
  if (Array.isArray(value))
    return path === 'dados' ? `${value.length} ${value.length === 1 ? 'dado' : 'dados'}` : `a list of ${value.length}`;
  if (value === null || typeof value !== 'object') return String(value);
  if (isPart(value)) {
    const count = openingParts(value).length;
    return `${count} ${count === 1 ? 'opening' : 'openings'}`;
  }
  if ('kind' in value) return String(value.kind);
  return Object.entries(value)
    .map(([key, inner]) => `${key} ${typeof inner === 'object' ? '…' : entryWords(`${path}.${key}`, inner, unit)}`)
    .join(', ');
}
