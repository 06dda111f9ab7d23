import { beforeEach, describe, expect, test } from 'vitest';
import { newFrame } from '#shared/kernel/particulars/new-frame.ts';
import { setField } from '#shared/kernel/particulars/set-field.ts';
import {
  dropCopy,
  dropEarlierCopy,
  findEarlierCopy,
  keepCopy,
  type UnsavedCopy,
} from '../../../../src/features/frame-page/model/unsaved-copy.ts';

const base = newFrame('in', 'Base');
const copy: UnsavedCopy = { version: 3, base, mine: setField(base, 'thickness', 0.7), at: '2026-05-04T10:00:00.000Z' };

beforeEach(() => {
  localStorage.clear();
});

describe('unsaved copy', () => {
  test('When a page went away unsaved, then the next one finds its work, for that frame alone', () => {
    expect(keepCopy(localStorage, 'one', copy)).toBe(true);
    expect(findEarlierCopy(localStorage, 'two')).toBeNull();
    expect(findEarlierCopy(localStorage, 'one')).toEqual(copy);
  });

  test('When the next page keeps a copy of its own, then the earlier one is not overwritten', () => {
    keepCopy(localStorage, 'one', copy);
    findEarlierCopy(localStorage, 'one');
    keepCopy(localStorage, 'one', { ...copy, version: 4 });
    dropCopy(localStorage, 'one');
    expect(findEarlierCopy(localStorage, 'one')).toEqual(copy);
    dropEarlierCopy(localStorage, 'one');
    expect(findEarlierCopy(localStorage, 'one')).toBeNull();
  });

  test.each(['not JSON', '{"version":1}'])(
    'When what was kept cannot be read (%s), then there is none and it is dropped',
    (text) => {
      localStorage.setItem('stilepost.unsaved.one', text);
      expect(findEarlierCopy(localStorage, 'one')).toBeNull();
      expect(localStorage).toHaveLength(0);
    },
  );

  test('When the browser refuses to keep it, then that is answered', () => {
    const full = {
      setItem: () => {
        throw new DOMException('full', 'QuotaExceededError');
      },
    } as unknown as Storage;
    expect(keepCopy(full, 'one', copy)).toBe(false);
  });
});
