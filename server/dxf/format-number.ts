/** Digits behind the point of a bulge. It is a ratio, not a length: fewer would move the crown of a long arc. */
export const BULGE_DECIMALS = 6;

/** Fixed decimals, no exponent, no −0. For lengths below 1e21, where toFixed itself turns to exponents; longer ones throw. */
export function formatNumber(value: number, decimals: number): string {
  if (!(Math.abs(value) < 1e15)) throw new RangeError(`drawing: got the number ${value}, takes one below 1e15`);
  const text = value.toFixed(decimals);
  return text.charCodeAt(0) === 45 && Number(text) === 0 ? text.slice(1) : text;
}
