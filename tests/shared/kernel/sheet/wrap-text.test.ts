import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { countCharacters, wrapText } from '#shared/kernel/sheet/wrap-text.ts';

describe('wrapText', () => {
  test('When text fits, then it is one line', () => {
    expect(wrapText('Left end', 8)).toEqual(['Left end']);
    expect(wrapText('', 8)).toEqual(['']);
  });

  test('When it does not, then it breaks at a space', () => {
    expect(wrapText('hold the board down', 10)).toEqual(['hold the', 'board down']);
  });

  test('When a length stands at the break, then it stays whole', () => {
    expect(wrapText('at least 35 1/2 in wide', 12)).toEqual(['at least', '35 1/2 in', 'wide']);
    expect(wrapText('strips 0.25 in wide', 12)).toEqual(['strips', '0.25 in wide']);
  });

  test('When a word is longer than the line, then it breaks after a joint, else anywhere', () => {
    expect(wrapText('fenwick-lane_kitchen', 14)).toEqual(['fenwick-lane_', 'kitchen']);
    expect(wrapText('aaaaaaaaaa', 4)).toEqual(['aaaa', 'aaaa', 'aa']);
  });

  test('When a length alone is wider than the line, then it breaks rather than overflows', () => {
    expect(wrapText('35 1/2', 4)).toEqual(['35', '1/2']);
  });

  test('When characters are outside the basic plane, then each counts once and none is torn', () => {
    expect(wrapText('🪚🪚🪚🪚', 2)).toEqual(['🪚🪚', '🪚🪚']);
  });

  test('For any text: no line is too long, nothing but white space is lost', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'grapheme', maxLength: 120 }), fc.integer({ min: 1, max: 40 }), (text, columns) => {
        const lines = wrapText(text, columns);
        for (const line of lines) expect(countCharacters(line)).toBeLessThanOrEqual(columns);
        expect(lines.join('').replace(/\s/gu, '')).toBe(text.replace(/\s/gu, ''));
      }),
    );
  });
});
