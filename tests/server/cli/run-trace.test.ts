import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { runTrace } from '../../../server/cli/run-trace.ts';
import { drawing, frameDrawing, rectangleLines } from '../../builders/drawings.ts';

let folder: string;
beforeEach(() => (folder = mkdtempSync(join(tmpdir(), 'stilepost-trace-'))));
afterEach(() => rmSync(folder, { recursive: true, force: true }));

function run(content: string, ...args: string[]) {
  const path = join(folder, 'a.dxf');
  writeFileSync(path, content);
  let out = '';
  let err = '';
  const code = runTrace([path, ...args], { out: (t) => (out += t), err: (t) => (err += t) });
  return { code, out, err };
}

describe('The trace command', () => {
  test('When the drawing holds a frame, then it is printed in the frame file’s form, and the exit code is 0', () => {
    const { code, out, err } = run(frameDrawing());
    expect({ code, err }).toEqual({ code: 0, err: '' });
    const { frames, ...said } = JSON.parse(out) as Record<string, unknown>;
    expect(said).toMatchObject({ unit: 'in', segments: 8, loops: 2, open: 0, problems: [] });
    expect(said.census).toEqual([
      { type: 'LINE', layer: 'FRAME', fate: 'kept', reason: null, count: 8, lines: [16, 28, 40, 52, 64, 76, 88, 100] },
    ]);
    expect(frames).toMatchObject([
      {
        width: 20,
        height: 30,
        openings: [
          [
            [2, 3],
            [18, 3],
            [18, 27],
            [2, 27],
          ],
        ],
      },
    ]);
  });

  test('When the unit is not known, then it asks for it and the exit code is 1; with it given, 0', () => {
    const asked = run(frameDrawing(null));
    expect(asked.code).toBe(1);
    expect(asked.err).toContain('give --unit in or --unit mm');
    const { code, out } = run(frameDrawing(null), '--unit', 'mm');
    expect([code, (JSON.parse(out) as { unit: string }).unit]).toEqual([0, 'mm']);
  });

  test('When a layer is left out, then its entities are set aside and counted', () => {
    const text = drawing([...rectangleLines(0, 0, 20, 30), ...rectangleLines(-1, -1, 21, 31, 'BLANK')]);
    const { out } = run(text, '--leave-out', 'blank');
    const { census, frames } = JSON.parse(out) as Record<string, unknown>;
    expect(census).toEqual([
      expect.objectContaining({ layer: 'FRAME', fate: 'kept', count: 4 }),
      expect.objectContaining({ layer: 'BLANK', fate: 'aside', reason: 'layer-left-out', count: 4 }),
    ]);
    expect(frames).toMatchObject([{ width: 20, height: 30 }]);
  });

  test('When there is nothing in it, then the exit code is 1 and it says so', () => {
    const { code, err } = run(drawing([]));
    expect(code).toBe(1);
    expect(err).toContain('no closed loop');
  });

  test.each([
    ['a PDF', '%PDF-1.7', 'is-pdf'],
    ['empty', '', 'empty-file'],
  ])('When the file is %s, then the exit code is 2, with a name and what to do', (_, content, reason) => {
    const { code, out, err } = run(content);
    expect({ code, out }).toEqual({ code: 2, out: '' });
    expect(err).toMatch(new RegExp(`^${reason}: .+Export`));
  });

  test.each([
    [['--unit', 'ft'], '--unit: got "ft", takes "in", "mm" or null'],
    [['--tolerance', 'wide'], '--tolerance: got'],
    [['--arcs', '9'], '--arcs: got 9, takes millimetres'],
    [['b.dxf'], 'got 2 files'],
  ])('When the command is given %j, then the exit code is 2 and it says what that takes', (args, said) => {
    const { code, err } = run(frameDrawing(), ...args);
    expect(code).toBe(2);
    expect(err).toContain(said);
  });

  test('When the file is not there, then the exit code is 2 and it is named', () => {
    let err = '';
    expect(runTrace([join(folder, 'none.dxf')], { out: () => undefined, err: (t) => (err += t) })).toBe(2);
    expect(err).toContain('none.dxf: cannot be read');
  });
});
