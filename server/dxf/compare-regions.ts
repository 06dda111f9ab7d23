import type { Extents, Point } from '#shared/kernel/contour/contour.ts';

type Span = readonly [from: number, to: number];

/** Spans in order, those that overlap or lie nearer than `gap` joined, those shorter than `gap` dropped. */
function joinSpans(spans: readonly Span[], gap: number): Span[] {
  const joined: [number, number][] = [];
  for (const [from, to] of [...spans].sort((a, b) => a[0] - b[0])) {
    const last = joined.at(-1);
    if (last && from <= last[1] + gap) last[1] = Math.max(last[1], to);
    else joined.push([from, to]);
  }
  return joined.filter(([from, to]) => to - from > gap);
}

/** Where an upright line at x is inside the outlines, by counting crossings; islands are outside. */
function spansInside(outlines: readonly (readonly Point[])[], x: number): Span[] {
  const crossings = outlines.flatMap((outline) =>
    outline.flatMap((a, i) => {
      const b = outline[(i + 1) % outline.length]!;
      return a.x > x === b.x > x ? [] : [a.y + ((x - a.x) / (b.x - a.x)) * (b.y - a.y)];
    }),
  );
  crossings.sort((a, b) => a - b);
  const spans: Span[] = [];
  for (let i = 0; i + 1 < crossings.length; i += 2) spans.push([crossings[i]!, crossings[i + 1]!]);
  return spans;
}

/**
 * Whether straight outlines together cover the very same region as upright rectangles do, which may overlap. Between
 * two neighbouring corners in x nothing changes, so one upright line in each such strip tells all.
 * Returns the differences of where those lines go in and out; Infinity where their number differs.
 */
export function compareRegions(
  outlines: readonly (readonly Point[])[],
  rectangles: readonly Extents[],
  tolerance: number,
): number[] {
  const gap = 2 * tolerance;
  const xs = [...outlines.flat().map((p) => p.x), ...rectangles.flatMap((r) => [r.minX, r.maxX])].sort((a, b) => a - b);
  const differences: number[] = [];
  for (let i = 0; i + 1 < xs.length; i++) {
    // A strip no wider than rounding is no strip.
    if (xs[i + 1]! - xs[i]! <= gap) continue;
    const x = (xs[i]! + xs[i + 1]!) / 2;
    const got = joinSpans(spansInside(outlines, x), gap);
    const wanted = joinSpans(
      rectangles.filter((r) => r.minX < x && x < r.maxX).map((r): Span => [r.minY, r.maxY]),
      gap,
    );
    if (got.length !== wanted.length) differences.push(Infinity);
    else wanted.forEach(([from, to], j) => differences.push(got[j]![0] - from, got[j]![1] - to));
  }
  return differences;
}
