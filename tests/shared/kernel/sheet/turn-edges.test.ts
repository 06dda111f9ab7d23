import { describe, expect, test } from 'vitest';
import type { Extents, Point } from '#shared/kernel/contour/contour.ts';
import { placePoint, unplace } from '#shared/kernel/placing/place.ts';
import { describeTurn } from '#shared/kernel/sheet/describe-turn.ts';
import { movingEdge, squaredCornerPlaces, turnedEdges, type EdgeSide } from '#shared/kernel/sheet/turn-edges.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { workedExample } from '../../../builders/worked-example.ts';
import { flipped } from './sheet-frames.ts';

/** Middle of a side, drawn in a little so that it lies on the board in both setups. */
const middleOf = (side: EdgeSide, e: Extents): Point =>
  ({
    left: { x: e.minX + 2, y: (e.minY + e.maxY) / 2 },
    right: { x: e.maxX - 2, y: (e.minY + e.maxY) / 2 },
    top: { x: (e.minX + e.maxX) / 2, y: e.maxY - 2 },
    bottom: { x: (e.minX + e.maxX) / 2, y: e.minY + 2 },
  })[side];

/** The side of a board that a point lies nearest to. */
function nearestSide(p: Point, e: Extents): EdgeSide {
  const distances: [EdgeSide, number][] = [
    ['left', p.x - e.minX],
    ['right', e.maxX - p.x],
    ['top', e.maxY - p.y],
    ['bottom', p.y - e.minY],
  ];
  return distances.sort((a, b) => a[1] - b[1])[0]![0];
}

describe('turning over', () => {
  for (const particulars of [workedExample(), flipped(workedExample())]) {
    const worked = workFrame(particulars);
    const { blank, back, front } = worked;
    const { flip } = particulars.setup;
    const turned = (p: Point) => placePoint(front.placement, placePoint(unplace(back.placement), p));

    test(`${flip}: each edge goes where the placements take it`, () => {
      for (const edge of turnedEdges(flip, blank.squaredEdges))
        expect(nearestSide(turned(middleOf(edge.before, back.board)), front.board), edge.letter).toBe(edge.after);
    });

    test(`${flip}: the two squared edges come to the left and the bottom, where the pins are`, () => {
      const squared = turnedEdges(flip, blank.squaredEdges).filter((e) => e.squared);
      expect(squared.map((e) => e.after).sort()).toEqual(['bottom', 'left']);
    });

    test(`${flip}: the squared corner lies where it is said, and comes to the pins`, () => {
      const { before, after } = squaredCornerPlaces(flip);
      const { x, y } = blank.squaredCorner;
      const middle = { x: back.board.maxX / 2, y: back.board.maxY / 2 };
      expect(before).toBe(`${y > middle.y ? 'upper' : 'lower'} ${x > middle.x ? 'right' : 'left'}`);
      expect(after).toBe('lower left');
      const landed = turned({ x, y });
      expect(Math.abs(landed.x) + Math.abs(landed.y)).toBeLessThanOrEqual(1e-9);
    });

    test(`${flip}: the lifted edge and the one it turns about change places, the others stay`, () => {
      const { lifted, pivot } = movingEdge(flip);
      const after = Object.fromEntries(turnedEdges(flip, []).map((e) => [e.before, e.after]));
      expect([after[lifted], after[pivot]]).toEqual([pivot, lifted]);
      for (const side of ['left', 'right', 'top', 'bottom'].filter((s) => s !== lifted && s !== pivot))
        expect(after[side]).toBe(side);
    });

    test(`${flip}: the page says where the corner goes and shows both faces`, () => {
      const page = describeTurn(worked);
      expect(page.lead).toContain(`from ${squaredCornerPlaces(flip).before} to lower left`);
      const shown = page.blocks
        .flatMap((b) => (b.kind === 'pictures' ? b.pictures : []))
        .flatMap((p) => p.picture.shapes);
      const words = shown.flatMap((s) => (s.kind === 'text' ? [s.text] : []));
      expect(words).toEqual(
        expect.arrayContaining(['BACK', 'FRONT', 'A', 'B', 'C', 'D', 'fold', 'back up', 'front up']),
      );
    });
  }

  test('When all edges are squared, then a rough edge is no longer what tells', () => {
    const { setup } = workedExample();
    const text = JSON.stringify(describeTurn(workFrame(workedExample({ setup: { ...setup, squaring: 'all-edges' } }))));
    expect(text).toContain('the corner alone tells');
    expect(text).not.toContain('A rough edge at a pin');
  });
});
