import { MM_PER_INCH, type Unit } from './unit.ts';

/** Converts a length; the same unit gives the very same number back. */
export function convertLength(value: number, from: Unit, to: Unit): number {
  if (from === to) return value;
  return from === 'in' ? value * MM_PER_INCH : value / MM_PER_INCH;
}
