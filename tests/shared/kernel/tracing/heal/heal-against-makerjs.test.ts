import makerjs from 'makerjs';
import { describe, expect, test } from 'vitest';
import { healCurves } from '#shared/kernel/tracing/heal/heal-curves.ts';
import { rectangle } from '#shared/kernel/contour/make-contour.ts';
import { curvesOf, explode, type Row } from './loose-curves.ts';

/** Closed chains that makerjs makes of the same lines: somebody else's chaining, right on clean drawings. */
function theirLoops(rows: readonly Row[]): number {
  const paths = Object.fromEntries(
    rows.map(([ax, ay, bx, by], i) => [`line${i}`, new makerjs.paths.Line([ax, ay], [bx, by])]),
  );
  const chains = makerjs.model.findChains({ paths });
  return Array.isArray(chains) ? chains.filter(({ endless }) => endless).length : 0;
}

const box = explode([rectangle({ minX: 0, minY: 0, maxX: 10, maxY: 20 })]);
const ours = (rows: readonly Row[]) =>
  healCurves(curvesOf(rows), { unit: 'mm' }).loops.filter(({ kind }) => kind !== 'outline').length;

describe('When the same lines are chained by makerjs', () => {
  test.each([
    ['one rectangle', 1, 1, box],
    ['two apart', 2, 2, [...box, ...explode([rectangle({ minX: 20, minY: 0, maxX: 30, maxY: 20 })])]],
    ['every line twice', 2, 1, [...box, ...box]],
    ['a rectangle that a line divides', 1, 2, [...box, [5, 0, 5, 20, 0] as Row]],
    ['a gap of 0.03 mm', 0, 1, [[0, 0, 9.97, 0, 0] as Row, ...box.slice(1)]],
  ] as const)('of %s, then it finds %i closed and we find %i', (_, theirs, wanted, rows) => {
    expect(theirLoops(rows)).toBe(theirs);
    expect(ours(rows)).toBe(wanted);
  });
});
