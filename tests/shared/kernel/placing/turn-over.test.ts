import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Contour, Point } from '#shared/kernel/contour/contour.ts';
import { flattenContour } from '#shared/kernel/contour/flatten-contour.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { arbitraryFrame } from '../../../builders/arbitrary-frame.ts';
import { expectNear } from '../../../builders/close-to.ts';
import { cornersOf, enteredDado } from '../../../builders/entered-dado.ts';
import { contoursIn, lineSet, vertexExtents } from '../../../builders/line-sets.ts';
import { differenceArea } from '../../../setup/clipper.ts';

/**
 * What a machinist does with the board, in numbers: the rough board Bw × Bh lies back face up with its lower left corner on the
 * pins; it is turned over about the fold and its squared edges, t in from the rough ones, are pushed against the pins.
 */
function layOnPins(p: Particulars, board: { width: number; height: number }, back: Point): Point {
  const t = p.setup.trim;
  return p.setup.flip === 'side-to-side'
    ? { x: board.width - back.x - t, y: back.y - t }
    : { x: back.x - t, y: board.height - back.y - t };
}

const EXACT = 1e-9;
const radius = 0.375 / 2;
const runs = { numRuns: 300 };

/** The rough board: given, or (W + 2k + 2t) × (H + 2k + 2t). */
function boardOf(p: Particulars): { width: number; height: number } {
  if (p.outline.kind !== 'members') throw new Error('frames of members only');
  const round = 2 * p.setup.allowance + 2 * p.setup.trim;
  return p.blank ?? { width: p.outline.width + round, height: p.outline.height + round };
}

const nearest = (value: number, among: readonly number[]) => Math.min(...among.map((other) => Math.abs(other - value)));

describe('When the back is turned over about the fold and laid on the pins', () => {
  test('then every dado lies where frame view says', () => {
    fc.assert(
      fc.property(arbitraryFrame, (p) => {
        fc.pre(p.dados.length > 0);
        const k = p.setup.allowance;
        const wanted = p.dados.map((dado) => enteredDado(dado, radius));
        const [xs, ys] = [wanted.flatMap((e) => [e.minX, e.maxX]), wanted.flatMap((e) => [e.minY, e.maxY])];
        const outlines = contoursIn(workFrame(p).back.lineSets.filter((s) => s.set === 'DADO'));
        const turned = outlines.map((outline) => outline.vertices.map((v) => layOnPins(p, boardOf(p), v)));
        const astray = turned.flat().map(({ x, y }) => Math.max(nearest(x - k, xs), nearest(y - k, ys)));
        expect(Math.max(...astray)).toBeLessThan(EXACT);
        const asEntered = wanted.map((e) => cornersOf(e).map(({ x, y }) => ({ x: x + k, y: y + k })));
        expect(differenceArea(turned.map(outermostFirst), asEntered)).toBeLessThan(1e-5);
      }),
      runs,
    );
  });

  test('then the squared edges lie against the pins', () => {
    fc.assert(
      fc.property(arbitraryFrame, (p) => {
        const [line] = contoursIn([lineSet(workFrame(p).back, 'SQUARING')]);
        const turned = line!.vertices.map((v) => layOnPins(p, boardOf(p), v));
        const { width, height } = p.outline as { width: number; height: number };
        const all = p.setup.squaring === 'all-edges';
        const [right, top] = [width + 2 * p.setup.allowance, height + 2 * p.setup.allowance];
        expect(turned).toHaveLength(all ? 4 : 3);
        const astray = turned.map(({ x, y }) =>
          Math.min(nearest(x, all ? [0, right] : [0]), nearest(y, all ? [0, top] : [0])),
        );
        expect(Math.max(...astray)).toBeLessThan(EXACT);
        // It meets at the corner of the pins.
        expect(turned.some(({ x, y }) => Math.abs(x) < EXACT && Math.abs(y) < EXACT)).toBe(true);
      }),
      runs,
    );
  });

  test('then the board that is left is the front’s blank', () => {
    fc.assert(
      fc.property(arbitraryFrame, (p) => {
        const board = boardOf(p);
        const [k, t] = [p.setup.allowance, p.setup.trim];
        const { width, height } = p.outline as { width: number; height: number };
        const wanted =
          p.setup.squaring === 'all-edges'
            ? { minX: 0, minY: 0, maxX: width + 2 * k, maxY: height + 2 * k }
            : { minX: 0, minY: 0, maxX: board.width - t, maxY: board.height - t };
        const worked = workFrame(p);
        const [blank] = contoursIn([lineSet(worked.front, 'BLANK')]);
        expectNear(vertexExtents(blank!.vertices), wanted, EXACT);
        const [rough] = contoursIn([lineSet(worked.back, 'BLANK')]);
        expectNear(vertexExtents(rough!.vertices), { minX: 0, minY: 0, maxX: board.width, maxY: board.height }, EXACT);
      }),
      runs,
    );
  });

  test('then openings and perimeter lie on the front where frame view says', () => {
    fc.assert(
      fc.property(arbitraryFrame, (p) => {
        const k = p.setup.allowance;
        const worked = workFrame(p);
        fc.pre(!worked.findings.some((finding) => finding.level === 'stop'));
        const pairs = [
          [contoursIn([lineSet(worked.front, 'PERIMETER')]), [worked.contours.perimeter]],
          [contoursIn([lineSet(worked.front, 'OPENING')]), worked.contours.openings.map((o) => o.contour)],
        ] as const;
        for (const [placed, entered] of pairs) {
          expect(placed).toHaveLength(entered.length);
          placed.forEach((contour, i) => expectMoved(contour, entered[i]!, k));
        }
      }),
      { ...runs, maxSkipsPerRun: 50 },
    );
  });
});

/** Clipper's union wants counter-clockwise outlines filled and clockwise ones as holes: the turn has changed both. */
const outermostFirst = (points: Point[]): Point[] => points.toReversed();

function expectMoved(placed: Contour, entered: Contour, k: number): void {
  expect(placed.vertices).toHaveLength(entered.vertices.length);
  const astray = placed.vertices.map((v, i) => {
    const was = entered.vertices[i]!;
    return Math.max(Math.abs(v.x - k - was.x), Math.abs(v.y - k - was.y), Math.abs(v.bulge - was.bulge));
  });
  expect(Math.max(...astray)).toBeLessThan(EXACT);
}

describe('When an arched opening is flattened on both sides of the move, then it is the same curve', () => {
  test('within a chord of 0.001', () => {
    fc.assert(
      fc.property(arbitraryFrame, (p) => {
        const worked = workFrame(p);
        const arched = worked.contours.openings.filter((o) => o.arch > 0);
        fc.pre(arched.length > 0);
        for (const o of arched) {
          const head = flattenContour(o.contour, 0.001);
          expect(Math.max(...head.map((q) => q.y)) - o.extents.maxY).toBeLessThan(EXACT);
          expect(o.extents.maxY - Math.max(...head.map((q) => q.y))).toBeLessThan(0.001);
        }
      }),
      { numRuns: 60, maxSkipsPerRun: 100 },
    );
  });
});
