import fc from 'fast-check';
import type { Contour } from '#shared/kernel/contour/contour.ts';
import type { FoundCurves } from '#shared/kernel/tracing/found-drawing.ts';

/** x and y of the start, x and y of the end, bulge. */
export type Row = readonly [number, number, number, number, number];

/** Segments as a reader hands them over, each of an entity of its own. */
export const curvesOf = (rows: readonly Row[]): FoundCurves => ({
  count: rows.length,
  segments: Float64Array.from(rows.flat()),
  entityOf: Uint32Array.from(rows, (_, i) => i),
});

/** The segments of contours, each on its own. */
export const explode = (contours: readonly Contour[]): Row[] =>
  contours.flatMap(({ vertices, closed }) =>
    vertices.slice(0, closed ? vertices.length : -1).map((a, i): Row => {
      const b = vertices[(i + 1) % vertices.length]!;
      return [a.x, a.y, b.x, b.y, a.bulge];
    }),
  );

export const reversed = ([ax, ay, bx, by, bulge]: Row): Row => [bx, by, ax, ay, bulge === 0 ? 0 : -bulge];

/** A segment in two at a share of its length; halves of an arc lie on its circle (bulge = tan(angle / 4), DXF Reference, group 42). */
export function cutAt([ax, ay, bx, by, bulge]: Row, share: number): Row[] {
  const angle = Math.atan(bulge);
  let [x, y] = [ax + share * (bx - ax), ay + share * (by - ay)];
  if (bulge !== 0) {
    const off = (1 - bulge * bulge) / (4 * bulge);
    const [cx, cy] = [(ax + bx) / 2 - (by - ay) * off, (ay + by) / 2 + (bx - ax) * off];
    const at = Math.atan2(ay - cy, ax - cx) + 4 * angle * share;
    const radius = Math.hypot(ax - cx, ay - cy);
    [x, y] = [cx + radius * Math.cos(at), cy + radius * Math.sin(at)];
  }
  return [
    [ax, ay, x, y, Math.tan(angle * share)],
    [x, y, bx, by, Math.tan(angle * (1 - share))],
  ];
}

export const moved = ([ax, ay, bx, by, bulge]: Row, dx: number, dy: number): Row => [
  ax + dx,
  ay + dy,
  bx + dx,
  by + dy,
  bulge,
];

/** What somebody's drawing program may do to a list of segments without changing what is drawn: order, direction, cuts, copies. */
export interface Mess {
  readonly order: readonly number[];
  readonly flips: readonly boolean[];
  readonly cuts: readonly (number | null)[];
  readonly copies: readonly boolean[];
}

const list = <T>(value: fc.Arbitrary<T>) => fc.array(value, { minLength: 64, maxLength: 64 });

export const arbitraryMess: fc.Arbitrary<Mess> = fc.record({
  order: list(fc.nat()),
  flips: list(fc.boolean()),
  cuts: list(fc.option(fc.double({ min: 0.1, max: 0.9, noNaN: true }), { freq: 2 })),
  copies: list(fc.boolean()),
});

/** The same drawing, messed up: each segment may be cut, and be there whole once more. */
export function messUp(rows: readonly Row[], { order, flips, cuts, copies }: Mess): Row[] {
  const pick = <T>(values: readonly T[], i: number) => values[i % values.length]!;
  const pieces = rows.flatMap((row, i) => {
    const cut = pick(cuts, i);
    const parts = cut === null ? [row] : cutAt(row, cut);
    return pick(copies, i) ? [...parts, row] : parts;
  });
  return pieces
    .map((row, i) => ({ row: pick(flips, i * 7 + 3) ? reversed(row) : row, key: pick(order, i * 13) + i / 1000 }))
    .sort((p, q) => p.key - q.key)
    .map(({ row }) => row);
}
