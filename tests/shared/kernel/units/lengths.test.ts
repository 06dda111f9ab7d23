import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { convertLength } from '#shared/kernel/units/convert-length.ts';
import { formatLength, formatOther, formatWithUnit } from '#shared/kernel/units/format-length.ts';
import { parseLength } from '#shared/kernel/units/parse-length.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';

const anyUnit = fc.constantFrom<Unit>('in', 'mm');
const read = (text: string, unit: Unit) => {
  const parsed = parseLength(text, unit);
  if (!parsed.ok) throw new Error(`"${text}" takes ${parsed.takes}`);
  return parsed.value;
};

describe('When a length is typed as people write it', () => {
  test.each<[string, Unit, number]>([
    ['30 1/2', 'in', 30.5],
    ['30-1/2', 'in', 30.5],
    ['30.5', 'in', 30.5],
    ['30 1/2"', 'in', 30.5],
    [' 30 1/2 in ', 'in', 30.5],
    ['1/64', 'in', 1 / 64],
    ['.75', 'in', 0.75],
    ['33', 'in', 33],
    ['-3/16', 'in', -0.1875],
    ['775', 'mm', 775],
    ['774.7', 'mm', 774.7],
    // 25.4 mm an inch, exactly: international yard and pound agreement of 1959.
    ['25.4mm', 'in', 1],
    ['762 mm', 'in', 30],
    ['30 1/2"', 'mm', 774.7],
    ['1in', 'mm', 25.4],
    ['44.45mm', 'in', 1.75],
    ['596.9mm', 'in', 23.5],
  ])('"%s" in a frame in %s, then it is %d', (text, unit, value) => {
    expect(read(text, unit)).toBe(value);
  });

  test('as millimetres that are whole 64ths of an inch, then an inch frame has just that 64th', () => {
    // 64ths of an inch in millimetres: n · 25.4 / 64 = n · 0.396875, six decimals at most.
    const strays = Array.from({ length: 97 * 64 }, (_, n) => n + 1).filter(
      (n) => read(`${((n * 396875) / 1e6).toFixed(6)}mm`, 'in') !== n / 64,
    );
    expect(strays).toEqual([]);
  });

  test.each([
    '',
    '   ',
    'abc',
    '1,5',
    '30 1/0',
    '1/',
    '/2',
    '1 2 3/4',
    '30 1/2 ft',
    '1e3',
    '--3',
    'NaN',
    'Infinity',
    '3..5',
    '30 1/2" mm',
  ])('but it is "%s", then it says what it takes', (text) => {
    const parsed = parseLength(text, 'in');
    expect(parsed.ok).toBe(false);
    expect(parsed.ok ? '' : parsed.takes.length).toBeGreaterThan(10);
  });
});

describe('When a length is shown', () => {
  test.each<[number, Unit, string]>([
    [30.5, 'in', '30 1/2'],
    [30, 'in', '30'],
    [0.75, 'in', '3/4'],
    [1 / 64, 'in', '1/64'],
    [-0.1875, 'in', '-3/16'],
    [0, 'in', '0'],
    [-0, 'in', '0'],
    [0.01, 'in', '0.01'],
    [0.76, 'in', '0.76'],
    [774.7, 'mm', '774.7'],
    [19, 'mm', '19'],
  ])('%d in %s, then it is "%s"', (value, unit, text) => {
    expect(formatLength(value, unit)).toBe(text);
  });

  test('that cannot be shown exactly, then it carries the mark ≈', () => {
    expect(formatLength(0.08216112345, 'in')).toMatch(/^≈0\.082\d+$/);
    expect(formatLength(100 / 3, 'mm')).toMatch(/^≈33\.33/);
  });

  test('then its unit and the other unit can be shown too', () => {
    expect(formatWithUnit(30.5, 'in')).toBe('30 1/2 in');
    expect(formatOther(30.5, 'in')).toBe('774.7 mm');
    expect(formatOther(25.4, 'mm')).toBe('1 in');
  });

  test.each([NaN, Infinity, -Infinity])('but it is %d, then that throws', (value) => {
    expect(() => formatLength(value, 'in')).toThrow();
  });
});

describe('When a length is shown and read again', () => {
  test('then every 64th of an inch comes back as the very same number', () => {
    fc.assert(
      fc.property(fc.integer({ min: -97 * 64, max: 97 * 64 }), (parts) => {
        expect(read(formatLength(parts / 64, 'in'), 'in')).toBe(parts / 64 + 0);
      }),
      { numRuns: 2000 },
    );
  });

  test('then every length of up to six decimals comes back as the very same number', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 3_000_000_000 }), anyUnit, (millionths, unit) => {
        const value = Number((millionths / 1e6).toFixed(6));
        const text = formatLength(value, unit);
        expect(text).not.toContain('≈');
        expect(read(text, unit)).toBe(value);
      }),
      { numRuns: 2000 },
    );
  });

  test('then a rounded one is never shown without the mark', () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 3000, noNaN: true }), anyUnit, (value, unit) => {
        const text = formatLength(value, unit);
        const shown = read(text.replace('≈', ''), unit);
        if (Math.abs(shown - value) > 1e-9) expect(text).toContain('≈');
      }),
      { numRuns: 2000 },
    );
  });

  test('then reading never throws, whatever was typed', () => {
    fc.assert(
      fc.property(fc.string({ maxLength: 20, unit: fc.constantFrom(...'0123456789 /-."inm,e+'.split('')) }), (text) => {
        const parsed = parseLength(text, 'in');
        if (parsed.ok) expect(Number.isFinite(parsed.value)).toBe(true);
      }),
      { numRuns: 5000 },
    );
  });
});

describe('When a length is converted', () => {
  test('to its own unit, then it is the very same number', () => {
    expect(convertLength(23.5, 'in', 'in')).toBe(23.5);
    expect(convertLength(0.1 + 0.2, 'mm', 'mm')).toBe(0.1 + 0.2);
  });

  test('to the other unit and back, then it is the same to the last digits', () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-3, max: 1e4, noNaN: true }), anyUnit, (value, unit) => {
        const other = unit === 'in' ? 'mm' : 'in';
        const back = convertLength(convertLength(value, unit, other), other, unit);
        // Fifteen significant digits either way: half a unit of the last one, twice.
        expect(Math.abs(back / value - 1)).toBeLessThan(1e-14);
      }),
    );
  });
});
