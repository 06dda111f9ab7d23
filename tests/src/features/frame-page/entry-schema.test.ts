import { describe, expect, test } from 'vitest';
import { particulars as contract } from '#shared/contracts/particulars.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { setField } from '#shared/kernel/particulars/set-field.ts';
import { createFrameEditor } from '../../../../src/features/frame-page/model/frame-editor.ts';
import { entrySchema } from '../../../../src/features/frame-page/model/entry-schema.ts';
import { beadedExample } from '../../../builders/beaded-example.ts';
import { workedExample } from '../../../builders/worked-example.ts';

const reached = (path: string, frame: Particulars = workedExample()): string => {
  const keys = path.split('.');
  return keys.slice(0, entrySchema(contract, keys, frame).keys).join('.');
};

describe('What an entry is held against', () => {
  test.each([
    ['outline.width', 'outline.width'],
    ['outline.stiles.left', 'outline.stiles.left'],
    ['thickness', 'thickness'],
    ['cutters.opening.tipRadius', 'cutters.opening.tipRadius'],
    // Read as a whole: the tree, and a dado, whose ends belong together.
    ['outline.layout.columns.0.size', 'outline.layout'],
    ['dados.0.to', 'dados.0'],
    // Not there: what is around it names it.
    ['outline.depth', 'outline'],
  ])('When %s is typed, then that is %s', (path, part) => {
    expect(reached(path)).toBe(part);
  });

  test('When an optional part is there, then its entries are held against their own', () => {
    const given = setField(workedExample(), 'blank', { width: 40, height: 40 });
    expect(reached('blank.width', given)).toBe('blank.width');
    expect(reached('edge.bead.radius', beadedExample())).toBe('edge.bead.radius');
  });

  // Each is taken or refused as the whole contract would have it, with the same words.
  test.each([
    ['outline.width', 0],
    ['outline.width', 12],
    ['outline.feet', -1],
    ['outline.layout.between', 0],
    ['outline.layout.columns.0.opening.arch', -2],
    ['dados.0.to', -5],
    ['dados.0.depth', 0],
    ['cutters.opening.sideAngle', 60],
    ['setup.flip', 'sideways'],
    ['name', ''],
  ])('When %s becomes %j, then it is judged as by the whole contract', (path, value) => {
    const frame = workedExample();
    const whole = contract.safeParse(setField(frame, path, value));
    const editor = createFrameEditor(frame);
    expect(editor.edit(path, value) === '').toBe(whole.success);
    if (!whole.success)
      expect(editor.edit(path, value)).toContain(whole.error.issues[0]!.message.replace('takes ', ''));
  });
});
