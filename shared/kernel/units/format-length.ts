import { SAME } from '../tolerances.ts';
import { convertLength } from './convert-length.ts';
import type { Unit } from './unit.ts';

/** Digits behind the point that are shown exactly; beyond them a length carries the mark ≈. */
const EXACT_DIGITS = 6;
/** Digits shown of a length that carries the mark. */
const ROUNDED_DIGITS: Record<Unit, number> = { in: 4, mm: 3 };

const trimZeros = (text: string) => (text.includes('.') ? text.replace(/\.?0+$/, '') : text);

/** `value` with up to `digits` digits behind the point, "≈" before it where that rounds. Never "-0". */
export function formatDecimal(value: number, digits: number): string {
  if (!Number.isFinite(value)) throw new RangeError(`no length: ${value}`);
  const exact = value.toFixed(EXACT_DIGITS);
  const isExact = Math.abs(Number(exact) - value) < SAME;
  const text = trimZeros(isExact ? exact : value.toFixed(digits));
  return `${isExact ? '' : '≈'}${text === '-0' ? '0' : text}`;
}

function asFraction(value: number): string | undefined {
  const parts = Math.round(Math.abs(value) * 64);
  if (Math.abs(parts / 64 - Math.abs(value)) >= SAME) return undefined;
  const sign = value < 0 && parts > 0 ? '-' : '';
  const whole = Math.floor(parts / 64);
  let top = parts % 64;
  if (top === 0) return `${sign}${whole}`;
  let bottom = 64;
  while (top % 2 === 0) {
    top /= 2;
    bottom /= 2;
  }
  return `${sign}${whole > 0 ? `${whole} ` : ''}${top}/${bottom}`;
}

/** A length as people of the trade read it: inches as fractions to 1/64 where exact, else decimals. Throws when not finite. */
export function formatLength(value: number, unit: Unit): string {
  return (
    (unit === 'in' && Number.isFinite(value) ? asFraction(value) : undefined) ??
    formatDecimal(value, ROUNDED_DIGITS[unit])
  );
}

/** With its unit: "30 1/2 in", "775 mm". */
export const formatWithUnit = (value: number, unit: Unit): string => `${formatLength(value, unit)} ${unit}`;

/** The same length in the other unit, for a hover. */
export function formatOther(value: number, unit: Unit): string {
  const other: Unit = unit === 'in' ? 'mm' : 'in';
  return `${formatDecimal(convertLength(value, unit, other), ROUNDED_DIGITS[other])} ${other}`;
}
