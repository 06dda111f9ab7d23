import { describe, expect, it } from 'vitest';
import { LIMITS } from '#shared/contracts/limits.ts';
import { traceDrawing } from '#shared/kernel/tracing/trace-drawing.ts';
import { PLAIN_TRACE } from '#shared/kernel/tracing/traced-drawing.ts';
import {
  defaultName,
  framesOfRoles,
  planFrames,
  rememberMembers,
} from '../../../../src/features/tracing/model/frame-plans.ts';
import { drawnLoops } from '../../../../src/features/tracing/model/loop-contours.ts';
import { startReview } from '../../../../src/features/tracing/model/review.ts';
import { whyNoFrames } from '../../../../src/features/tracing/model/why-no-frames.ts';
import { drawing, frameDrawing, rectangleLines } from '../../../builders/drawings.ts';

function plansOf(text: string, view: 'front' | 'back' = 'front') {
  const traced = traceDrawing(new TextEncoder().encode(text), PLAIN_TRACE);
  const review = startReview(traced);
  const plans = planFrames({
    review,
    traced: framesOfRoles({ review, loops: drawnLoops(traced.loops), view }),
    fileName: 'base.DXF',
    membersOf: rememberMembers(traced.unit ?? 'in'),
  });
  return { traced, plans };
}

describe('frames of a drawing', () => {
  it('When there is one frame, then it has the name of the file; several are counted', () => {
    expect(defaultName('kitchen.dxf', 0, 1)).toBe('kitchen');
    expect(defaultName('Kitchen.DXF', 1, 2)).toBe('Kitchen 2');
    expect(defaultName('.dxf', 0, 1)).toBe('Drawing');
    expect(defaultName(`${'x'.repeat(300)}.dxf`, 11, 12)).toHaveLength(LIMITS.nameLength);
  });

  it('When a drawing shows the back, then the frame is mirrored', () => {
    const off = drawing([...rectangleLines(0, 0, 20, 30), ...rectangleLines(2, 3, 10, 27)]);
    const lefts = (['front', 'back'] as const).map((view) => {
      const [opening] = plansOf(off, view).plans.frames[0]!.outline.openings;
      return Math.min(...opening!.map(([x]) => x));
    });
    expect(lefts).toEqual([2, 10]);
  });

  it('When all is well, then nothing is in the way; without a unit, a frame or a confirmation there is', () => {
    const { traced, plans } = plansOf(frameDrawing());
    expect(whyNoFrames(traced, plans, false)).toBe('');
    const empty = plansOf(drawing([]));
    expect(whyNoFrames(empty.traced, empty.plans, false)).toBe('There is no line in it to trace.');
    const without = plansOf(frameDrawing(null));
    expect(without.plans.frames).toEqual([]);
    expect(whyNoFrames(without.traced, without.plans, false)).toBe('Choose the unit first.');
    expect(whyNoFrames(traced, { frames: [], problems: [] }, false)).toBe('No loop is a perimeter yet.');
    const cut = { ...traced, incomplete: true };
    expect(whyNoFrames(cut, plans, false)).toBe('Confirm that the drawing is whole enough.');
    expect(whyNoFrames(cut, plans, true)).toBe('');
  });

  it('When a frame has more openings than are taken, then it says how many, and asks no more of it', () => {
    const holes = Array.from({ length: LIMITS.openings + 1 }, (_, i) => rectangleLines(3 * i + 1, 1, 3 * i + 2, 2));
    const { traced, plans } = plansOf(drawing([...rectangleLines(0, 0, 400, 3), ...holes.flat()]));
    expect(plans.frames[0]).toMatchObject({
      takes: `It has ${LIMITS.openings + 1} openings; takes at most ${LIMITS.openings}. Leave some out.`,
      members: null,
    });
    expect(whyNoFrames(traced, plans, false)).toContain(`takes at most ${LIMITS.openings}`);
  });
});
