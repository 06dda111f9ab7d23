import { describe, expect, test } from 'vitest';
import { readField } from '#shared/kernel/particulars/read-field.ts';
import { setField } from '#shared/kernel/particulars/set-field.ts';
import { exampleFrame } from './example-frame.ts';

describe('setField', () => {
  test('When one entry changes, then it alone changes and everything beside its path keeps its identity', () => {
    const after = setField(exampleFrame, 'outline.stiles.left', 2);
    expect(readField(after, 'outline.stiles.left')).toBe(2);
    expect(readField(exampleFrame, 'outline.stiles.left')).toBe(1.75);
    expect(after.cutters).toBe(exampleFrame.cutters);
    expect(readField(after, 'outline.layout')).toBe(readField(exampleFrame, 'outline.layout'));
  });

  test('When a list entry changes, then its neighbours keep their identity', () => {
    const after = setField(exampleFrame, 'outline.layout.columns.1.opening.label', 'Drawer');
    expect(readField(after, 'outline.layout.columns.1.opening')).toEqual({ label: 'Drawer' });
    expect(readField(after, 'outline.layout.columns.0')).toBe(readField(exampleFrame, 'outline.layout.columns.0'));
  });

  test('When the value is there already, then the very same particulars come back', () => {
    expect(setField(exampleFrame, 'thickness', 0.75)).toBe(exampleFrame);
  });

  test('When an optional entry is set and taken out, then the key comes and goes', () => {
    const sized = setField(exampleFrame, 'outline.layout.columns.0.size', 12);
    expect(readField(sized, 'outline.layout.columns.0.size')).toBe(12);
    expect(setField(sized, 'outline.layout.columns.0.size', undefined)).toEqual(exampleFrame);
    expect(
      Object.keys(
        readField(setField(sized, 'outline.layout.columns.0.size', undefined), 'outline.layout.columns.0') as object,
      ),
    ).toEqual(['opening']);
  });

  test.each(['dados.0.depth', 'outline.layout.rows.0', 'blank.width', 'outline.layout.columns.x'])(
    'When the path %s leads nowhere, then it throws and names it',
    (path) => {
      expect(() => setField(exampleFrame, path, 1)).toThrow(path);
    },
  );
});
