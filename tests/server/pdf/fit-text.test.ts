import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { CHARACTER_WIDTH } from '#shared/kernel/sheet/paper-picture.ts';
import { fitText, LINE_HEIGHT } from '../../../server/pdf/fit-text.ts';

describe('fitText', () => {
  test('When it fits at the largest size, then it has it', () => {
    expect(fitText('Left end', 30, 4, [3, 2])).toEqual({ lines: ['Left end'], size: 3 });
  });

  test('When it fits only smaller or in two lines, then the largest that does is taken', () => {
    expect(fitText('Left end', 12, 4, [3, 2])).toEqual({ lines: ['Left end'], size: 2 });
    expect(fitText('Left end', 12, 8, [3, 2])).toEqual({ lines: ['Left', 'end'], size: 3 });
  });

  test('When it fits at no size, then it is cut and says so', () => {
    expect(fitText('Left end of the long wall', 8, 2.7, [2]).lines).toEqual(['Left…']);
  });

  test('For any text it stays within its room', () => {
    fc.assert(
      fc.property(
        fc.string({ maxLength: 300 }),
        fc.double({ min: 10, max: 90, noNaN: true }),
        fc.double({ min: 4, max: 12, noNaN: true }),
        (text, width, height) => {
          const { lines, size } = fitText(text, width, height, [4, 3, 2]);
          expect(lines.length * size * LINE_HEIGHT).toBeLessThanOrEqual(Math.max(height, size * LINE_HEIGHT) + 1e-9);
          for (const line of lines)
            expect(Array.from(line).length * CHARACTER_WIDTH * size).toBeLessThanOrEqual(width + 1e-9);
        },
      ),
    );
  });
});
