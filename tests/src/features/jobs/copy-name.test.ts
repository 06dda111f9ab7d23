// @vitest-environment node
import { describe, expect, it } from 'vitest';
import { LIMITS } from '#shared/contracts/limits.ts';
import { copyName } from '../../../../src/features/jobs/copy-name.ts';

describe('copyName', () => {
  it.each([
    ['B33', ['B33'], 'B33 copy'],
    ['B33', ['B33', 'B33 copy'], 'B33 copy 2'],
    ['B33 copy', ['B33', 'B33 copy'], 'B33 copy 2'],
    ['B33 copy 2', ['B33 copy', 'B33 copy 2'], 'B33 copy 3'],
  ])('When %s is copied beside %j, then the copy is %s', (name, taken, expected) => {
    expect(copyName(name, taken)).toBe(expected);
  });

  it('When the name is as long as names may be, then the copy is no longer', () => {
    const name = copyName('x'.repeat(LIMITS.nameLength), []);
    expect(name).toHaveLength(LIMITS.nameLength);
    expect(name.endsWith(' copy')).toBe(true);
  });
});
