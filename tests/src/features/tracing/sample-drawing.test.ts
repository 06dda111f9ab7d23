import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { traceDrawing } from '#shared/kernel/tracing/trace-drawing.ts';
import { PLAIN_TRACE } from '#shared/kernel/tracing/traced-drawing.ts';
import { drawnLoops } from '../../../../src/features/tracing/model/loop-contours.ts';
import { framesOfRoles, planFrames, rememberMembers } from '../../../../src/features/tracing/model/frame-plans.ts';
import { startReview } from '../../../../src/features/tracing/model/review.ts';
import { sampleDrawing } from '../../../../src/features/tracing/sample-drawing.ts';
import { readWithEzdxf } from '../../../readers/read-with-ezdxf.ts';

const folder = mkdtempSync(join(tmpdir(), 'stilepost-sample-'));
afterAll(() => rmSync(folder, { recursive: true }));

describe('the drawing to try', () => {
  it('When ezdxf reads it, then it finds nothing to mend and counts what was drawn', () => {
    const path = join(folder, 'sample.dxf');
    writeFileSync(path, sampleDrawing());
    const [file] = readWithEzdxf([path]);
    expect(file!.errors).toEqual([]);
    expect(file!.version).toBe('AC1009');
    const count = (type: string) => file!.entities.filter((entity) => entity.type === type).length;
    expect([count('LINE'), count('ARC'), count('TEXT')]).toEqual([20, 1, 1]);
  });

  it('When it is read here, then two frames, a closed gap, a line drawn twice and a title come of it', () => {
    const drawing = traceDrawing(new TextEncoder().encode(sampleDrawing()), PLAIN_TRACE);
    expect(drawing.unit).toBe('in');
    expect(drawing.counts).toMatchObject({ gapsClosed: 1, duplicates: 1 });
    expect(drawing.open).toEqual([]);
    const set = planFrames({
      review: startReview(drawing),
      traced: framesOfRoles({ review: startReview(drawing), loops: drawnLoops(drawing.loops), view: 'front' }),
      fileName: 'two-frames.dxf',
      membersOf: rememberMembers('in'),
    });
    expect(
      set.frames.map(({ name, width, height, outline }) => [name, width, height, outline.openings.length]),
    ).toEqual([
      ['two-frames 1', 33, 30.5, 2],
      ['two-frames 2', 17.5, 30.5, 1],
    ]);
    const [, arched] = set.frames;
    // The arch was drawn 2 high over 14: the form with members has that number again.
    expect(arched!.members).toMatchObject({ ok: true, outline: { layout: { opening: { arch: 2 } } } });
  });
});
