import { describe, expect, test } from 'vitest';
import { segmentDistance } from '#shared/kernel/contour/segment-distance.ts';
import { segmentsOf } from '#shared/kernel/contour/segments.ts';
import { placeContour, unplace } from '#shared/kernel/placing/place.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { contoursIn, lineSet } from '../../../builders/line-sets.ts';
import { beadedExample } from '../../../builders/beaded-example.ts';
import { workedExample } from '../../../builders/worked-example.ts';

const nubs = (p = beadedExample()) => workFrame(p).findings.filter(({ code }) => code === 'bead-nub');

describe('When the bead’s passes meet on a mitre', () => {
  test('then what neither reaches is as long as the note says, by the distance to the lines of both', () => {
    const p = beadedExample();
    const { front } = workFrame(p);
    const back = unplace(front.placement);
    const lines = (['BEAD_INNER', 'BEAD_OUTER'] as const).flatMap((set) =>
      contoursIn([lineSet(front, set)]).flatMap((contour) => segmentsOf(placeContour(back, contour))),
    );
    // Opening A's lower left corner; the mitre runs outward, down to the left.
    const [x, y] = [1.75, 1.25];
    const reach = 3 / 32 + 1 / 64;
    const step = 1e-4;
    let missed = 0;
    for (let along = 0; along < 0.3; along += step) {
      const at = { x: x - along * Math.SQRT1_2, y: y - along * Math.SQRT1_2 };
      const point = { kind: 'line', a: at, b: { x: at.x + 1e-9, y: at.y } } as const;
      if (Math.min(...lines.map((line) => segmentDistance(line, point))) > reach) missed += step;
    }
    // Up to the quirk, behind which nothing is meant to be cut.
    const quirkEnds = (2 * 3) / 32 + 1 / 8;
    const beyond = 0.3 - (quirkEnds * Math.SQRT2 > 0.3 ? 0.3 : quirkEnds * Math.SQRT2);
    const [nub] = nubs();
    expect(nub!.numbers.length).toBeCloseTo(reach * (Math.SQRT2 - 1), 9);
    expect(Math.abs(missed - beyond - nub!.numbers.length!)).toBeLessThan(5 * step);
  });

  test('then it is a note with what to do, for beaded openings only', () => {
    const [nub, ...more] = nubs();
    expect(more).toEqual([]);
    expect(nub).toMatchObject({ level: 'note' });
    expect(nub!.text).toContain('Dress it by hand');
    expect(nubs(workedExample())).toEqual([]);
    const { outline } = beadedExample();
    if (outline.kind !== 'members') throw new Error('the example has members');
    const square = { opening: { label: 'A', edge: 'square' } } as const;
    const one = beadedExample({
      outline: { ...outline, layout: { columns: [square, { opening: { label: 'B' } }], between: 1.5 } },
    });
    expect(nubs(one)[0]!.places.map(({ features }) => features)).toEqual([['opening-1']]);
  });
});
