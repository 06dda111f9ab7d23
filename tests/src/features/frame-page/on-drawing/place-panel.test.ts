import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { placePanel, type Box } from '../../../../../src/features/frame-page/on-drawing/place-panel.ts';

const SPREAD = { width: 920, height: 460 };
const PANEL = { width: 224, height: 240 };
const box = (left: number, top: number, width: number, height: number): Box => ({ left, top, width, height });
const covers = (p: { x: number; y: number }, b: Box): boolean =>
  p.x < b.left + b.width && b.left < p.x + PANEL.width && p.y < b.top + b.height && b.top < p.y + PANEL.height;

describe('placePanel', () => {
  test('When there is room beside the opening on neither side of its page, then the panel stands on the other page, beside the same opening there', () => {
    // Opening over most of the right page; the left page shows it narrower at its left edge.
    const own = box(520, 60, 380, 340);
    const other = box(20, 60, 200, 340);
    const p = placePanel({ spread: SPREAD, panel: PANEL, own, other, now: null });
    expect(covers(p, own)).toBe(false);
    expect(covers(p, other)).toBe(false);
  });

  test('When it covers nothing where it is, then it stays there; when what it edits has grown under it, then it moves', () => {
    const other = box(0, 0, 10, 10);
    const now = { x: 500, y: 100 };
    expect(placePanel({ spread: SPREAD, panel: PANEL, own: box(300, 100, 150, 200), other, now })).toBe(now);
    const grown = box(300, 100, 220, 200);
    expect(covers(placePanel({ spread: SPREAD, panel: PANEL, own: grown, other, now }), grown)).toBe(false);
  });

  test('When what is edited fills a page at most, then the panel never covers it and never leaves the spread, wherever it lies', () => {
    const number = (max: number) => fc.integer({ min: 0, max });
    fc.assert(
      fc.property(fc.boolean(), number(420), number(420), number(420), number(420), (onRight, a, b, c, d) => {
        const page = onRight ? 470 : 30;
        const own = box(page + Math.min(a, b), 20 + Math.min(c, d), Math.abs(a - b), Math.abs(c - d));
        // The other page shows it mirrored about the fold.
        const other = box(SPREAD.width - own.left - own.width, own.top, own.width, own.height);
        const p = placePanel({ spread: SPREAD, panel: PANEL, own, other, now: null });
        expect(covers(p, own)).toBe(false);
        expect(p.x).toBeGreaterThanOrEqual(0);
        expect(p.y).toBeGreaterThanOrEqual(0);
        expect(p.x + PANEL.width).toBeLessThanOrEqual(SPREAD.width);
        expect(p.y + PANEL.height).toBeLessThanOrEqual(SPREAD.height);
      }),
    );
  });
});
