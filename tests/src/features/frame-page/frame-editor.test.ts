import { describe, expect, test, vi } from 'vitest';
import { checkFrame } from '#shared/kernel/check-frame.ts';
import { newFrame } from '#shared/kernel/particulars/new-frame.ts';
import { readField } from '#shared/kernel/particulars/read-field.ts';
import { setField } from '#shared/kernel/particulars/set-field.ts';
import { createFrameEditor } from '../../../../src/features/frame-page/model/frame-editor.ts';

const start = newFrame('in', 'Base');
const present = (editor: ReturnType<typeof createFrameEditor>) => editor.store.get().history.present;

describe('frame editor', () => {
  test('When an entry is typed, then the frame is worked out anew and drawn', () => {
    const editor = createFrameEditor(start);
    expect(editor.edit('outline.width', 40)).toBe('');
    expect(editor.store.get().lines.contours.width).toBe(40);
    expect(editor.store.get().drawn).toBe(editor.store.get().lines);
  });

  test('When a value breaks the contract, then nothing changes and it says what the entry takes', () => {
    const editor = createFrameEditor(start);
    const followed = vi.fn();
    editor.store.subscribe(followed);
    expect(editor.edit('thickness', 0)).toContain('above 0');
    expect(present(editor)).toBe(start);
    expect(followed).not.toHaveBeenCalled();
  });

  test('When a value breaks a rule that spans two entries, then the other entry is named', () => {
    const editor = createFrameEditor(start);
    const { to } = start.dados[0]!;
    expect(editor.edit('dados.0.from', to + 1)).toMatch(/, to.*beyond/);
    expect(present(editor)).toBe(start);
  });

  test('When members do not add up, then that is a finding and the last good drawing stays', () => {
    const editor = createFrameEditor(start);
    editor.edit('outline.width', 40);
    const good = editor.store.get().drawn;
    editor.edit('outline.stiles.left', 50);
    expect(readField(present(editor), 'outline.stiles.left')).toBe(50);
    expect(checkFrame(editor.store.get().lines).findings.some((f) => f.level === 'stop')).toBe(true);
    expect(editor.store.get().drawn).toBe(good);
    editor.edit('outline.stiles.left', 5);
    expect(editor.store.get().drawn.contours.members.find((m) => m.id === 'stile-left')?.width).toBe(5);
  });

  test('When keystrokes are undone, then texts being typed are dropped; while typing they are not', () => {
    const editor = createFrameEditor(start);
    editor.edit('outline.width', 4);
    editor.edit('outline.width', 40);
    expect(editor.store.get().epoch).toBe(0);
    editor.undo();
    expect(present(editor)).toBe(start);
    expect(editor.store.get().epoch).toBe(1);
    editor.redo();
    expect(present(editor).outline).toMatchObject({ width: 40 });
  });

  test('When an entry holds a text that changed nothing, then undo takes that back first', () => {
    const editor = createFrameEditor(start);
    editor.edit('outline.width', 40);
    editor.leaveEntry();
    editor.setWrong('outline.height', 'a length');
    editor.undo();
    expect(editor.store.get().wrong.size).toBe(0);
    expect(present(editor).outline).toMatchObject({ width: 40 });
    editor.undo();
    expect(present(editor)).toBe(start);
  });

  test('When an entry went wrong after good keystrokes, then one undo takes back both', () => {
    const editor = createFrameEditor(start);
    editor.edit('outline.width', 4);
    editor.setWrong('outline.width', 'a length');
    editor.undo();
    expect(present(editor)).toBe(start);
    expect(editor.store.get().wrong.size).toBe(0);
  });

  test('When changed particulars are put in place that break the contract, then they are refused', () => {
    const editor = createFrameEditor(start);
    expect(editor.apply(setField(start, 'name', ''), 'Import')).not.toBe('');
    expect(present(editor)).toBe(start);
    expect(editor.apply(setField(start, 'name', 'Other'), 'Import')).toBe('');
    expect(present(editor).name).toBe('Other');
  });
});
