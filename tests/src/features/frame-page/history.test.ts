import { describe, expect, test } from 'vitest';
import { newFrame } from '#shared/kernel/particulars/new-frame.ts';
import { setField } from '#shared/kernel/particulars/set-field.ts';
import {
  closeEntry,
  record,
  redo,
  startHistory,
  undo,
  type History,
} from '../../../../src/features/frame-page/model/history.ts';

const start = newFrame('in', 'Base');
const type = (history: History, path: string, ...values: number[]): History =>
  values.reduce((h, value) => record(h, setField(h.present, path, value), path, path), history);

describe('history of a frame', () => {
  test('When keystrokes follow one another in one entry, then one undo takes them all back', () => {
    const typed = type(startHistory(start), 'outline.width', 3, 36, 36.5);
    expect(typed.past).toHaveLength(1);
    expect(undo(typed).present).toBe(start);
  });

  test('When an entry is left and typed in again, then undo takes back the second time alone', () => {
    const first = type(startHistory(start), 'outline.width', 36);
    const second = type(closeEntry(first), 'outline.width', 40);
    expect(undo(second).present).toBe(first.present);
  });

  test('When another entry is typed in, then it is a step of its own', () => {
    const both = type(type(startHistory(start), 'outline.width', 36), 'outline.height', 40);
    expect(both.past.map((step) => step.label)).toEqual(['outline.width', 'outline.height']);
  });

  test('When steps are undone and redone, then the same particulars come back, and typing drops what was undone', () => {
    const typed = type(type(startHistory(start), 'outline.width', 36), 'outline.height', 40);
    const back = undo(undo(typed));
    expect(back.present).toBe(start);
    expect(redo(redo(back)).present).toBe(typed.present);
    expect(type(back, 'thickness', 0.7).future).toEqual([]);
  });

  test('When typing goes on right after an undo, then it does not join the step before', () => {
    const again = type(
      undo(type(closeEntry(type(startHistory(start), 'outline.width', 36)), 'outline.width', 40)),
      'outline.width',
      41,
    );
    expect(undo(again).present.outline).toMatchObject({ width: 36 });
  });

  test('When there is nothing to undo or redo, or nothing changes, then the history stays the same', () => {
    const history = startHistory(start);
    expect(undo(history)).toBe(history);
    expect(redo(history)).toBe(history);
    expect(record(history, start, 'nothing')).toBe(history);
  });

  test('When more steps are made than are kept, then the oldest ones go and undo still works', () => {
    let history = startHistory(start);
    for (let i = 0; i < 400; i += 1)
      history = record(history, setField(history.present, 'thickness', 0.5 + i / 1000), `step ${i}`);
    expect(history.past).toHaveLength(300);
    expect(undo(history).present.thickness).toBe(0.5 + 398 / 1000);
  });
});
