import { convertLength } from './convert-length.ts';
import type { Unit } from './unit.ts';

export type ParsedLength =
  { readonly ok: true; readonly value: number } | { readonly ok: false; readonly takes: string };

const NUMBER = String.raw`(?<decimal>\d+\.\d*|\.\d+|\d+)`;
const FRACTION = String.raw`(?:(?<whole>\d+)(?:\s+|\s*-\s*))?(?<top>\d+)\s*/\s*(?<bottom>\d+)`;
const SUFFIX = String.raw`(?<suffix>"|”|″|''|in(?:ch(?:es)?)?\.?|mm)?`;
const LENGTH = new RegExp(String.raw`^(?<sign>[-−+])?\s*(?:${FRACTION}|${NUMBER})\s*${SUFFIX}$`, 'i');

const EXAMPLES: Record<Unit, string> = {
  in: 'a length such as 30 1/2, 30.5 or 775mm',
  mm: 'a length such as 775, 774.7 or 30 1/2"',
};

/**
 * Reads a length as people write it: `30 1/2`, `30-1/2`, `30.5`, `30 1/2"`, `775mm`. Without a suffix it is in `unit`;
 * with one it is converted into `unit`. A comma is refused, since it means a decimal point to some and thousands to others.
 */
export function parseLength(text: string, unit: Unit): ParsedLength {
  const found = LENGTH.exec(text.trim())?.groups;
  if (!found) return { ok: false, takes: EXAMPLES[unit] };
  let size: number;
  if (found.bottom !== undefined) {
    const bottom = Number(found.bottom);
    if (bottom === 0) return { ok: false, takes: 'a fraction whose lower number is not 0' };
    // One division only, so that the result is the float nearest to the written fraction.
    size = (Number(found.whole ?? 0) * bottom + Number(found.top)) / bottom;
  } else {
    size = Number(found.decimal);
  }
  const written: Unit = found.suffix === undefined ? unit : found.suffix.toLowerCase() === 'mm' ? 'mm' : 'in';
  const value = convertLength(size, written, unit);
  if (!Number.isFinite(value)) return { ok: false, takes: EXAMPLES[unit] };
  return { ok: true, value: (found.sign === '-' || found.sign === '−') && value !== 0 ? -value : value };
}
