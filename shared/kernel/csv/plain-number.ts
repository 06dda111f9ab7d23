/** A number of 0 or more as digits and a decimal point, without an exponent and without loss: 1e-7 is 0.0000001. Throws for any other. */
export function plainNumber(value: number): string {
  if (!(value >= 0 && Number.isFinite(value)))
    throw new RangeError(`number: got ${value}, takes a finite one, 0 or more`);
  const [digits = '', exponent] = String(value).split('e');
  if (exponent === undefined) return digits;
  const [whole = '', part = ''] = digits.split('.');
  const shift = Number(exponent);
  return shift < 0 ? `0.${'0'.repeat(-shift - 1)}${whole}${part}` : `${whole}${part}${'0'.repeat(shift - part.length)}`;
}

const PLAIN = /^(\d+\.?\d*|\.\d+)$/;

/** Reads such a number; `undefined` for anything else: fractions, commas, signs, exponents. */
export const readPlainNumber = (text: string): number | undefined => (PLAIN.test(text) ? Number(text) : undefined);
