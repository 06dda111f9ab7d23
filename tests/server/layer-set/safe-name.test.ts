import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { safeName, safeNames } from '../../../server/layer-set/safe-name.ts';

describe('When a name goes into a file name', () => {
  test.each([
    ['Fenwick Lane kitchen', 'Fenwick-Lane-kitchen'],
    ['  Küche / Straße №5 ', 'Kuche-Strasse-No5'],
    ['Smørrebrød Œuvre', 'Smorrebrod-OEuvre'],
    ['../../etc/passwd', 'etc-passwd'],
    ['30 1/2" base (left)', '30-1-2-base-left'],
    ['食器棚', 'frame'],
    ['', 'frame'],
    ['…', 'frame'],
    ['NUL', 'frame-NUL'],
    ['com1', 'frame-com1'],
    ['LPT¹', 'frame-LPT1'],
    ['console', 'console'],
    [`${'a'.repeat(39)} b`, 'a'.repeat(39)],
  ])('then %j becomes %j', (name, safe) => expect(safeName(name, 'frame')).toBe(safe));

  // Names that Windows keeps for devices: Microsoft, "Naming Files, Paths, and Namespaces".
  test('then whatever it was, the result is one that every system takes', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'grapheme' }), (name) => {
        const safe = safeName(name, 'frame');
        return (
          /^[A-Za-z0-9][A-Za-z0-9-]{0,45}$/.test(safe) &&
          !/^(con|prn|aux|nul|com\d|lpt\d)$/i.test(safe) &&
          !safe.endsWith('-')
        );
      }),
      { numRuns: 500 },
    );
  });
});

describe('When several frames lie in one zip', () => {
  test('then no two have the same name where capitals do not matter', () => {
    expect(safeNames(['Base', 'base', 'BASE!', 'Base-2', '食器棚', '', 'frame-2'], 'frame')).toEqual([
      'Base',
      'base-2',
      'BASE-3',
      'Base-2-2',
      'frame',
      'frame-2',
      'frame-2-2',
    ]);
  });

  test('then that holds for any names', () => {
    const names = fc.array(
      fc.oneof(fc.constantFrom('a', 'A', 'a-2', 'A-2-2', 'con', ''), fc.string({ maxLength: 3 })),
      { maxLength: 12 },
    );
    fc.assert(
      fc.property(names, (all) => new Set(safeNames(all, 'frame').map((n) => n.toLowerCase())).size === all.length),
    );
  });
});

test('When a name is taken by something else in the zip, then the frame gets another', () => {
  expect(safeNames(['sha256sums', 'Base'], 'frame', ['SHA256SUMS'])).toEqual(['sha256sums-2', 'Base']);
});
