import { describe, expect, test } from 'vitest';
import type { LayoutPart, MembersOutline } from '#shared/kernel/particulars/particulars.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { stepFeature } from '../../../../../src/features/frame-page/on-drawing/step-feature.ts';
import { workedExample } from '../../../../builders/worked-example.ts';

const WAYS = { right: [1, 0], left: [-1, 0], up: [0, 1], down: [0, -1] } as const;
type Way = keyof typeof WAYS;

const contoursOf = (layout: LayoutPart, feet = 0) => {
  const example = workedExample();
  return workFrame({ ...example, dados: [], outline: { ...(example.outline as MembersOutline), layout, feet } })
    .contours;
};

const named = (label: string): LayoutPart => ({ opening: { label } });

/** Walks from the middle of a feature and answers the labels that one comes through. */
function walk(contours: ReturnType<typeof contoursOf>, from: string, ways: readonly Way[]): string[] {
  let feature = [...contours.openings, ...contours.members].find((f) => f.label === from)!;
  const { extents: e } = feature;
  let at = { x: (e.minX + e.maxX) / 2, y: (e.minY + e.maxY) / 2 };
  return ways.map((way) => {
    const step = stepFeature(contours, feature, at, WAYS[way][0], WAYS[way][1]);
    if (step === null) return 'stays';
    ({ feature, at } = step);
    return feature.label;
  });
}

describe('stepFeature', () => {
  const drawers = contoursOf({
    columns: [{ rows: [named('A'), named('B'), named('C')], between: 1.5 }, named('D')],
    between: 1.5,
  });

  test('When one walks across, then openings and members come in the order in which they lie, and the last one is stayed on', () => {
    expect(walk(drawers, 'B', ['right', 'right', 'right', 'right'])).toEqual([
      'Mid-stile',
      'D',
      'Right stile',
      'stays',
    ]);
    expect(walk(drawers, 'D', ['left', 'left', 'left', 'left'])).toEqual(['Mid-stile', 'B', 'Left stile', 'stays']);
  });

  test('When one walks up and down, then so do rows and mid-rails', () => {
    expect(walk(drawers, 'A', ['down', 'down', 'down', 'down', 'down', 'down'])).toEqual([
      'Mid-rail',
      'B',
      'Mid-rail',
      'C',
      'Bottom rail',
      'stays',
    ]);
    expect(walk(drawers, 'Bottom rail', ['up', 'up'])).toEqual(['Mid-stile', 'Top rail']);
  });

  test('When one crosses a member that many openings touch, then one goes on along the line on which one came', () => {
    expect(walk(drawers, 'A', ['right', 'right', 'left', 'left'])).toEqual(['Mid-stile', 'D', 'Mid-stile', 'A']);
    expect(walk(drawers, 'C', ['left', 'right'])).toEqual(['Left stile', 'C']);
  });

  test('When a frame has feet, then every opening and member can be walked to from the first opening', () => {
    const contours = contoursOf(
      {
        rows: [
          { columns: [named('A'), named('B')], between: 2 },
          { columns: [named('C'), named('D'), named('E')], between: 1 },
        ],
        between: 1.5,
      },
      4,
    );
    const all = [...contours.openings, ...contours.members];
    const middle = ({ extents: e }: (typeof all)[number]) => ({ x: (e.minX + e.maxX) / 2, y: (e.minY + e.maxY) / 2 });
    const seen = new Map([[all[0]!.id, { feature: all[0]!, at: middle(all[0]!) }]]);
    const waiting = [...seen.values()];
    for (let here = waiting.pop(); here; here = waiting.pop()) {
      for (const [right, up] of Object.values(WAYS)) {
        const step = stepFeature(contours, here.feature, here.at, right, up);
        if (!step || seen.has(step.feature.id)) continue;
        seen.set(step.feature.id, step);
        waiting.push(step);
      }
    }
    expect([...seen.keys()].toSorted()).toEqual(all.map((f) => f.id).toSorted());
  });
});
