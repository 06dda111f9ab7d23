import { describe, expect, test } from 'vitest';
import { parseFrameFile } from '#shared/contracts/parse-frame-file.ts';
import { writeFrameFile } from '#shared/contracts/write-frame-file.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { workedExample } from '../../builders/worked-example.ts';

/** The same value with the keys of every object turned round, as a database may give it back. */
function turnedRound<T>(value: T): T {
  if (Array.isArray(value)) return value.map(turnedRound) as T;
  if (value === null || typeof value !== 'object') return value;
  return Object.fromEntries(
    Object.entries(value)
      .reverse()
      .map(([k, v]) => [k, turnedRound(v as unknown)]),
  ) as T;
}

describe('When a frame file is written', () => {
  const text = writeFrameFile(workedExample());

  test('then reading it gives the particulars back', () => {
    const read = parseFrameFile(text);
    expect(read.ok && read.particulars).toEqual(workedExample());
  });

  test('then the order of keys does not matter', () => {
    expect(writeFrameFile(turnedRound(workedExample()))).toBe(text);
  });

  test('then it is laid out for people: the format first, short parts on one line, a line end at the end', () => {
    const lines = text.split('\n');
    expect(lines.slice(0, 4)).toEqual([
      '{',
      '  "format": "stilepost.frame/1",',
      '  "name": "Two-door base",',
      '  "unit": "in",',
    ]);
    expect(lines).toContain('    "stiles": { "left": 1.75, "right": 1.75 },');
    expect(lines).toContain('      "ends": ["open", "open"]');
    expect(lines.at(-1)).toBe('');
  });

  test('then numbers stay what they are', () => {
    const particulars = workedExample({ thickness: 0.1 + 0.2 });
    const read = parseFrameFile(writeFrameFile(particulars));
    expect(read.ok && read.particulars.thickness).toBe(0.30000000000000004);
  });

  test('then what is absent is left out, and a number that is none is refused', () => {
    expect(writeFrameFile({ ...workedExample(), blank: undefined })).toBe(text);
    expect(() => writeFrameFile({ ...workedExample(), thickness: NaN } as Particulars)).toThrow(/got the number NaN/);
  });
});
