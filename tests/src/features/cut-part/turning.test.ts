import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  firstHold,
  NO_TURN,
  panOn,
  turnOn,
  zoomOn,
  type Hold,
  type Turn,
} from '../../../../src/features/cut-part/model/turning.ts';
import { spreadOut, visibleHeight } from '../../../../src/features/cut-part/scene/lay-out.ts';

/** Turns a direction: v + 2q × (q × v + w·v). */
function turned([x, y, z, w]: Turn, [vx, vy, vz]: [number, number, number]): [number, number, number] {
  const [tx, ty, tz] = [2 * (y * vz - z * vy), 2 * (z * vx - x * vz), 2 * (x * vy - y * vx)];
  return [vx + w * tx + y * tz - z * ty, vy + w * ty + z * tx - x * tz, vz + w * tz + x * ty - y * tx];
}
const held: Hold = { turn: NO_TURN, zoom: 1, pan: { x: 0, y: 0 } };
const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe('When the part is turned', () => {
  test('then dragging right brings its front to the right, dragging up brings it up', () => {
    expect(turned(turnOn(held, 0.1, 0).turn, [0, 0, 1])[0]).toBeGreaterThan(0);
    expect(turned(turnOn(held, 0, -0.1).turn, [0, 0, 1])[1]).toBeGreaterThan(0);
  });

  test('then it stays a turn, however often', () => {
    fc.assert(
      fc.property(fc.array(fc.tuple(number(-3, 3), number(-3, 3)), { maxLength: 60 }), (moves) => {
        const { turn } = moves.reduce((hold, [a, b]) => turnOn(hold, a, b), held);
        expect(Math.hypot(...turn)).toBeCloseTo(1, 12);
      }),
    );
  });

  test('then the back comes up as the board is turned: side to side keeps what is up up, end over end keeps left left', () => {
    const facing = (flip: 'side-to-side' | 'end-over-end', v: [number, number, number]) =>
      turned(firstHold('back', flip).turn, v);
    for (const flip of ['side-to-side', 'end-over-end'] as const)
      expect(facing(flip, [0, 0, -1])[2]).toBeGreaterThan(0.7);
    expect(facing('side-to-side', [0, 1, 0])[1]).toBeGreaterThan(0.7);
    expect(facing('side-to-side', [1, 0, 0])[0]).toBeLessThan(-0.7);
    expect(facing('end-over-end', [0, 1, 0])[1]).toBeLessThan(-0.7);
    expect(facing('end-over-end', [1, 0, 0])[0]).toBeGreaterThan(0.7);
  });
});

describe('When the part is zoomed', () => {
  test('then what lies under the pointer stays there', () => {
    fc.assert(
      fc.property(
        number(-5, 5),
        number(-5, 5),
        number(0.6, 3),
        number(-4, 4),
        number(-4, 4),
        (panX, panY, factor, x, y) => {
          const before = panOn(held, panX, panY);
          const after = zoomOn(before, factor, { x, y });
          // The pointer's distance from the middle shrinks in lengths of the part as it is drawn larger.
          const share = before.zoom / after.zoom;
          expect(x * share - after.pan.x).toBeCloseTo(x - before.pan.x, 9);
          expect(y * share - after.pan.y).toBeCloseTo(y - before.pan.y, 9);
        },
      ),
    );
  });

  test('then there is a closest and a furthest', () => {
    expect(zoomOn(held, 1e9).zoom).toBe(200);
    expect(zoomOn(held, 1e-9).zoom).toBe(0.5);
  });
});

describe('When both faces are shown', () => {
  const region = { minX: 0, minY: 0, maxX: 30, maxY: 20 };

  test('then the back lies left of the front, or above it when the board is turned end over end', () => {
    const [front, back] = spreadOut(region, 0.75, { shown: 'both', flip: 'side-to-side' });
    expect(back!.to.x).toBeLessThan(-15);
    expect(front!.to.x).toBeGreaterThan(15);
    const [below, above] = spreadOut(region, 0.75, { shown: 'both', flip: 'end-over-end' });
    expect(above!.to.y).toBeGreaterThan(10);
    expect(below!.to.y).toBeLessThan(-10);
  });

  test('then the screen is high enough for all of it, wide or narrow', () => {
    expect(visibleHeight(region, 0.75, { shown: 'both', flip: 'side-to-side' }, 1)).toBeGreaterThan(60);
    expect(visibleHeight(region, 0.75, { shown: 'both', flip: 'side-to-side' }, 4)).toBeGreaterThan(20);
    expect(visibleHeight(region, 0.75, { shown: 'front', flip: 'side-to-side' }, 1)).toBeLessThan(40);
  });
});
