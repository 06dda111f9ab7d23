import { describe, expect, test } from 'vitest';
import { isProductCode, sourceFiles } from './source-files.ts';
import { TEXT_RULES } from './text-rules.ts';

const files = sourceFiles();

describe.each(TEXT_RULES)('$name', ({ applies, find, breaker }) => {
  test('When every file is read, then none breaks it', () => {
    const held = files.filter((file) => applies(file.path));
    expect(held.length).toBeGreaterThan(0);
    expect(held.flatMap((file) => find(file).map((found) => `${file.path}:${found}`))).toEqual([]);
  });

  test('When a file breaks it, then it is found', () => {
    expect(applies(breaker.path)).toBe(true);
    expect(find(breaker)).not.toEqual([]);
  });
});

describe('When the lengths of all files of the product are counted', () => {
  const lengths = files
    .filter((file) => isProductCode(file.path))
    .map((file) => file.text.trimEnd().split('\n').length);
  lengths.sort((a, b) => a - b);

  test('then the median is about 70 lines', () => {
    expect(lengths.length).toBeGreaterThan(50);
    expect(lengths[Math.floor(lengths.length / 2)]).toBeLessThanOrEqual(90);
  });

  test('then hardly any is over 250', () => {
    expect(lengths.filter((length) => length > 250).length).toBeLessThanOrEqual(lengths.length * 0.03);
  });
});
