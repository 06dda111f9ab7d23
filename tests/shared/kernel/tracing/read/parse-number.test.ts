import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { parseNumber } from '#shared/kernel/tracing/read/parse-number.ts';
import { bytesOf } from './dxf-text.ts';

const parse = (text: string): number => {
  // Digits on both sides show that nothing beyond the ends is read.
  const bytes = bytesOf(`7${text}7`);
  return parseNumber(bytes, 1, bytes.length - 1);
};

const digits = (most: number) => fc.stringMatching(new RegExp(`^[0-9]{0,${most}}$`));

/** Decimals of every shape: signs, leading and trailing zeros, long tails, exponents. */
const decimal = fc
  .tuple(
    fc.constantFrom('', '-', '+'),
    digits(24),
    fc.boolean(),
    digits(24),
    fc.option(fc.integer({ min: -340, max: 320 })),
  )
  .filter(([, whole, , part]) => whole.length + part.length > 0)
  .map(([sign, whole, point, part, power]) => {
    const tail = point || part !== '' ? `.${part}` : '';
    return `${sign}${whole}${tail}${power === null ? '' : `e${power}`}`;
  })
  .filter((text) => /\d/.test(text.split('e')[0]!));

describe('When a number is read from bytes', () => {
  test('then it is to the last bit what Number() makes of the same text', () => {
    fc.assert(
      fc.property(decimal, (text) => {
        const wanted = Number(text);
        fc.pre(Number.isFinite(wanted));
        expect(parse(text)).toBe(wanted);
      }),
      { numRuns: 5000 },
    );
  });

  test('then every double comes back from its shortest text, and from 6, 12 and 17 digits as Number() reads them', () => {
    fc.assert(
      fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), (value) => {
        expect(parse(String(value))).toBe(value === 0 && !Object.is(value, 0) ? 0 : value);
        for (const digits of [6, 12, 17]) {
          const text = value.toExponential(digits - 1);
          expect(parse(text)).toBe(Number(text));
        }
        for (const text of [value.toFixed(6), value.toFixed(16)]) expect(parse(text)).toBe(Number(text));
      }),
      { numRuns: 3000 },
    );
  });

  test.each([
    '0',
    '-0',
    '+5',
    '.5',
    '5.',
    '007',
    '1E3',
    '1e+3',
    '10.50000000000000000000',
    '9007199254740993',
    '1e-400',
    '0e999999',
  ])('then %s is taken as Number() takes it', (text) => expect(parse(text)).toBe(Number(text)));

  test.each([
    '',
    'nan',
    'NaN',
    'inf',
    'Infinity',
    '1,5',
    '1d2',
    '1e400',
    '-1e400',
    '1e',
    '1e+',
    '.',
    '-',
    '+-1',
    '1.2.3',
    '0x10',
    '1 2',
    '1_0',
    '--1',
    'e5',
    '1e5.0',
  ])('then “%s” is none', (text) => expect(parse(text)).toBeNaN());

  test('then other text is refused whenever Number() refuses it', () => {
    fc.assert(
      fc.property(fc.stringMatching(/^[-+.0-9eEdx, ]{1,12}$/), (text) => {
        // Number() also takes hexadecimal and space about it, which no group value is.
        const wanted = /^[-+.0-9eE]+$/.test(text) ? Number(text) : NaN;
        expect(parse(text)).toBe(Number.isFinite(wanted) ? wanted : NaN);
      }),
      { numRuns: 3000 },
    );
  });
});
