import { divideExactly } from './divide-exactly.ts';

/** Powers of ten that a double holds exactly. */
const EXACT_POWERS = Array.from({ length: 23 }, (_, i) => Number(`1e${i}`));
/** To a whole number up to this one more digit can be added without rounding: a tenth of 2^53. */
const ROOM_FOR_DIGIT = Math.floor(2 ** 53 / 10) - 1;
/** So many digits more are kept apart: together with the first ones still exact in two doubles. */
const MORE_DIGITS = 3;
const LARGEST_EXPONENT = 100_000;

const PLUS = 43;
const MINUS = 45;
const POINT = 46;
const ZERO = 48;

const isDigit = (byte: number): boolean => byte >= ZERO && byte <= 57;

/**
 * The decimal number that stands between two places of a file, nothing beside it; NaN for anything else: empty,
 * `nan`, `1,5`, `1d2`, and what no double holds (`1e400`). Rounded as Number() does: when the digits and the power
 * of ten are both exact in a double, one division or product rounds once (Clinger, How to Read Floating Point Numbers
 * Accurately, 1990); with a few digits more a division in two doubles does (divide-exactly.ts); otherwise Number() itself
 * reads the text.
 */
export function parseNumber(bytes: Uint8Array, start: number, end: number): number {
  let at = start;
  const sign = at < end ? bytes[at]! : 0;
  if (sign === MINUS || sign === PLUS) at++;
  let mantissa = 0;
  let more = 0;
  let moreDigits = 0;
  let digits = 0;
  let exact = true;
  let point = -1;
  for (; at < end; at++) {
    const digit = bytes[at]! - ZERO;
    if (digit >= 0 && digit <= 9) {
      digits++;
      if (mantissa <= ROOM_FOR_DIGIT) mantissa = mantissa * 10 + digit;
      else if (moreDigits < MORE_DIGITS) {
        more = more * 10 + digit;
        moreDigits++;
      } else exact = false;
    } else if (digit === POINT - ZERO && point < 0) point = digits;
    else break;
  }
  if (digits === 0) return NaN;
  let power = point < 0 ? 0 : point - digits;
  if (at < end) {
    const exponent = parseExponent(bytes, at, end);
    if (exponent !== exponent) return NaN;
    power += exponent;
  }
  if (mantissa === 0 && exact) return sign === MINUS ? -0 : 0;
  let size: number;
  if (!exact || power > 22 || power < -22) return finiteOf(bytes, start, end);
  else if (moreDigits === 0) size = power < 0 ? mantissa / EXACT_POWERS[-power]! : mantissa * EXACT_POWERS[power]!;
  else {
    if (power > 0) return finiteOf(bytes, start, end);
    size = divideExactly(mantissa, EXACT_POWERS[moreDigits]!, more, EXACT_POWERS[-power]!);
    if (size !== size) return finiteOf(bytes, start, end);
  }
  return sign === MINUS ? -size : size;
}

/** The whole number after an `e` that ends at `end`; NaN when it is none. */
function parseExponent(bytes: Uint8Array, start: number, end: number): number {
  // Bit 5 is what tells small letters from capitals.
  if ((bytes[start]! | 32) !== 101) return NaN;
  let at = start + 1;
  const sign = bytes[at];
  if (at < end && (sign === MINUS || sign === PLUS)) at++;
  if (at >= end) return NaN;
  let value = 0;
  for (; at < end; at++) {
    const byte = bytes[at]!;
    if (!isDigit(byte)) return NaN;
    if (value < LARGEST_EXPONENT) value = value * 10 + byte - ZERO;
  }
  return sign === MINUS ? -value : value;
}

/** Number() of text that is known to be a decimal number. */
function finiteOf(bytes: Uint8Array, start: number, end: number): number {
  let text = '';
  for (let at = start; at < end; at++) text += String.fromCharCode(bytes[at]!);
  const value = Number(text);
  return Number.isFinite(value) ? value : NaN;
}
