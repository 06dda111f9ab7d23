/** Splits a double into two of 26 bits each, whose products are exact (Veltkamp). */
const SPLITTER = 2 ** 27 + 1;

/** The quotient's second part is known to many more bits than these: both bounds of it have to round alike. */
const ABOVE = 1 + 2 ** -40;
const BELOW = 1 - 2 ** -40;

/**
 * (high · scale + low) / divisor, rounded once to the nearest double; NaN when it lies too near the middle between two
 * doubles to tell. All four are whole numbers that are exact, high · scale + low below 2^64. The product and the rest of
 * the division are exact in two doubles (Dekker, A floating-point technique for extending the available precision, 1971);
 * that both bounds of the quotient round alike proves the result (Ziv, 1991).
 */
export function divideExactly(high: number, scale: number, low: number, divisor: number): number {
  // high · scale = product + productRest
  const product = high * scale;
  let split = SPLITTER * high;
  const highTop = split - (split - high);
  const highRest = high - highTop;
  split = SPLITTER * scale;
  const scaleTop = split - (split - scale);
  const scaleRest = scale - scaleTop;
  const productRest = highRest * scaleRest - (product - highTop * scaleTop - highRest * scaleTop - highTop * scaleRest);
  // + low = sum + sumRest
  const sum = product + low;
  const sumRest = low - (sum - product) + productRest;
  // sum = quotient · divisor + what is left
  const quotient = sum / divisor;
  const back = quotient * divisor;
  split = SPLITTER * quotient;
  const quotientTop = split - (split - quotient);
  const quotientRest = quotient - quotientTop;
  split = SPLITTER * divisor;
  const divisorTop = split - (split - divisor);
  const divisorRest = divisor - divisorTop;
  const backRest =
    quotientRest * divisorRest -
    (back - quotientTop * divisorTop - quotientRest * divisorTop - quotientTop * divisorRest);
  const step = (sum - back - backRest + sumRest) / divisor;
  const result = quotient + step * ABOVE;
  return result === quotient + step * BELOW ? result : NaN;
}
