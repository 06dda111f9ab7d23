import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { newFrame } from '#shared/kernel/particulars/new-frame.ts';
import { setField } from '#shared/kernel/particulars/set-field.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { hitTest } from '../../../../src/features/frame-page/model/hit-test.ts';
import { nearestPoint, nextPoint, snapPoints } from '../../../../src/features/frame-page/model/snap-points.ts';
import {
  boardInFrameView,
  fitTo,
  fromPage,
  panView,
  setupMap,
  toPage,
  zoomView,
} from '../../../../src/features/frame-page/model/view.ts';

const page = { width: 400, height: 300 };
const frames = (['side-to-side', 'end-over-end'] as const).map((flip) =>
  workFrame(setField(newFrame('in', 'Base'), 'setup.flip', flip)),
);
const faces = frames.flatMap((worked) =>
  [worked.back, worked.front].map((work) => ({ worked, work, name: `${worked.blank.flip}, ${work.face}` })),
);

describe('view of the spread', () => {
  test.each(faces)('When a place goes to the page and back ($name), then it is the same place', ({ worked, work }) => {
    const view = fitTo(boardInFrameView(worked), page);
    fc.assert(
      fc.property(
        fc.double({ min: -50, max: 50, noNaN: true }),
        fc.double({ min: -50, max: 50, noNaN: true }),
        (x, y) => {
          const back = fromPage(view, work.placement, page, toPage(view, work.placement, page, { x, y }));
          expect(back.x).toBeCloseTo(x, 9);
          expect(back.y).toBeCloseTo(y, 9);
        },
      ),
    );
  });

  test.each(faces)('When the board is fitted ($name), then the whole of it is on the page', ({ worked, work }) => {
    const view = fitTo(boardInFrameView(worked), page);
    const { sx, sy, dx, dy } = setupMap(view, work.placement, page);
    const corners = [work.board.minX, work.board.maxX]
      .map((x) => sx * x + dx)
      .concat([work.board.minY, work.board.maxY].map((y) => sy * y + dy));
    for (const x of corners.slice(0, 2)) expect(x > 0 && x < page.width).toBe(true);
    for (const y of corners.slice(2)) expect(y > 0 && y < page.height).toBe(true);
  });

  test.each(faces)(
    'When it zooms about a place ($name), then that place stays where it is on the page',
    ({ worked, work }) => {
      const view = fitTo(boardInFrameView(worked), page);
      const place = { x: 3, y: 7 };
      const before = toPage(view, work.placement, page, place);
      const after = toPage(zoomView(view, 2.5, place), work.placement, page, place);
      expect(after.x).toBeCloseTo(before.x, 9);
      expect(after.y).toBeCloseTo(before.y, 9);
    },
  );

  test.each(faces)('When the board is dragged ($name), then it follows the pointer', ({ worked, work }) => {
    const view = fitTo(boardInFrameView(worked), page);
    const before = toPage(view, work.placement, page, { x: 1, y: 1 });
    const after = toPage(panView(view, work.placement, 12, -5), work.placement, page, { x: 1, y: 1 });
    expect(after.x - before.x).toBeCloseTo(12, 9);
    expect(after.y - before.y).toBeCloseTo(-5, 9);
  });

  test('When a board turned side to side is looked at, then left of the back is right of the front', () => {
    const [worked] = frames;
    const view = fitTo(boardInFrameView(worked!), page);
    const place = { x: 2, y: 10 };
    const back = toPage(view, worked!.back.placement, page, place);
    const front = toPage(view, worked!.front.placement, page, place);
    expect(back.x + front.x).toBeCloseTo(page.width, 9);
    expect(back.y).toBeCloseTo(front.y, 9);
  });
});

describe('pointing', () => {
  const [worked] = frames as [(typeof frames)[number]];

  test('When a place lies in an opening, a member or a dado, then that is found', () => {
    for (const opening of worked.contours.openings) {
      const middle = {
        x: (opening.extents.minX + opening.extents.maxX) / 2,
        y: (opening.extents.minY + opening.extents.maxY) / 2,
      };
      expect(hitTest(worked, middle, 0)).toContain(opening.id);
    }
    for (const dado of worked.dados) {
      const middle = { x: (dado.extents.minX + dado.extents.maxX) / 2, y: (dado.extents.minY + dado.extents.maxY) / 2 };
      expect(hitTest(worked, middle, 0)[0]).toBe(dado.id);
    }
    expect(hitTest(worked, { x: -5, y: -5 }, 0)).toEqual([]);
  });

  test('When a place is near a corner, then measuring catches the corner; when far, nothing', () => {
    const points = snapPoints(worked);
    expect(nearestPoint(points, { x: worked.contours.width + 0.01, y: -0.01 }, 0.1)).toEqual({
      x: worked.contours.width,
      y: 0,
    });
    expect(nearestPoint(points, { x: -30, y: -30 }, 0.1)).toBeNull();
  });

  test('When an arrow steps from corner to corner, then every step goes that way and it ends', () => {
    const points = snapPoints(worked);
    let at = points[0]!;
    let steps = 0;
    for (let next = nextPoint(points, at, 1, 0); next !== null; next = nextPoint(points, at, 1, 0)) {
      expect(next.x).toBeGreaterThan(at.x);
      at = next;
      steps += 1;
    }
    expect(steps).toBeGreaterThan(2);
    expect(steps).toBeLessThan(points.length);
  });
});
