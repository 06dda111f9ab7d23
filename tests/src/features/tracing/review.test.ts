import { describe, expect, it } from 'vitest';
import { traceDrawing } from '#shared/kernel/tracing/trace-drawing.ts';
import { PLAIN_TRACE, type TracedDrawing } from '#shared/kernel/tracing/traced-drawing.ts';
import {
  carryOver,
  chooseMembers,
  giveRole,
  hasSaid,
  nameFrame,
  redoRole,
  startReview,
  undoRole,
} from '../../../../src/features/tracing/model/review.ts';
import { sampleDrawing } from '../../../../src/features/tracing/sample-drawing.ts';

const read = (options: Partial<typeof PLAIN_TRACE> = {}): TracedDrawing =>
  traceDrawing(new TextEncoder().encode(sampleDrawing()), { ...PLAIN_TRACE, ...options });

/** Place of the loop whose lower left corner lies at x, with that role. */
const loopAt = ({ loops, origin }: TracedDrawing, x: number): number =>
  loops.findIndex(({ vertices }) => Math.abs(Math.min(...vertices.map((v) => v[0])) + origin[0] - x) < 0.01);

describe('review of a drawing', () => {
  const drawing = read();
  const first = loopAt(drawing, 1.75);
  const third = loopAt(drawing, 39.75);

  it('When roles are given, then each step is taken back and done again in turn', () => {
    const start = startReview(drawing);
    const one = giveRole(start, [first], 'dado', 'one');
    const two = giveRole(one, [first, third], 'leave-out', 'two');
    expect([two.roles[first], two.roles[third]]).toEqual(['leave-out', 'leave-out']);
    expect(undoRole(two).roles).toEqual(one.roles);
    expect(undoRole(undoRole(two)).roles).toEqual(start.roles);
    expect(redoRole(undoRole(two)).roles).toEqual(two.roles);
    expect(hasSaid(undoRole(undoRole(two)))).toBe(false);
    expect(hasSaid(two)).toBe(true);
  });

  it('When a role is given after one was taken back, then what was taken back is gone', () => {
    const one = undoRole(giveRole(startReview(drawing), [first], 'dado', 'one'));
    const other = giveRole(one, [third], 'dado', 'other');
    expect(redoRole(other)).toBe(other);
  });

  it('When a loop gets the role that it has, then there is no step', () => {
    const start = startReview(drawing);
    expect(giveRole(start, [first], 'opening', 'none')).toBe(start);
  });

  it('When a loop is not there, then it throws with its number', () => {
    expect(() => giveRole(startReview(drawing), [99], 'dado', 'x')).toThrow('99');
  });

  it('When the drawing is read again in another unit, then what was said goes over to the same loops', () => {
    const perimeter = loopAt(drawing, 38);
    const said = chooseMembers(
      nameFrame(giveRole(startReview(drawing), [third], 'leave-out', 'x'), perimeter, 'Arched'),
      perimeter,
      true,
    );
    const again = read({ unit: 'mm', gap: 0.1 });
    const next = carryOver(said, again);
    expect(next.roles[loopAt(again, 39.75)]).toBe('leave-out');
    expect(next.names.get(loopAt(again, 38))).toBe('Arched');
    expect([...next.members]).toEqual([loopAt(again, 38)]);
    expect(next.lost).toBe(0);
    expect(next.roles.filter((role) => role === 'leave-out')).toHaveLength(1);
  });

  it('When the next reading lies about another origin, then the same loop is the one at the same place of the drawing', () => {
    // Moved by the distance of two openings of one size: by numbers alone, the second would be taken for the first.
    const apart = 15.5;
    const [x, y] = drawing.origin;
    const loops = drawing.loops.map((loop) => ({
      ...loop,
      vertices: loop.vertices.map(([vx, vy, bulge]) => [vx - apart, vy, bulge ?? 0] as const),
    }));
    const next = carryOver(giveRole(startReview(drawing), [first], 'dado', 'x'), {
      ...drawing,
      origin: [x + apart, y],
      loops,
    });
    expect(next.roles.flatMap((role, i) => (role === 'dado' ? [i] : []))).toEqual([first]);
  });

  it('When the loop is not in the next reading, then it is counted as lost', () => {
    // With no gap closed, the second opening does not close.
    const second = loopAt(drawing, 17.25);
    const again = read({ gap: 0 });
    expect(again.open).toHaveLength(1);
    const next = carryOver(giveRole(startReview(drawing), [second], 'dado', 'x'), again);
    expect(next.lost).toBe(1);
    expect(next.roles).not.toContain('dado');
  });
});
