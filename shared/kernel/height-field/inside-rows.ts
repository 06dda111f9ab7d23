import type { Contour } from '../contour/contour.ts';
import { segmentsOf, type Segment } from '../contour/segments.ts';

/** A piece of a contour that rises or falls all the way; `low` and `high` are its ends' Y, shared exactly with its neighbours. */
interface Edge {
  readonly low: number;
  readonly high: number;
  readonly xAt: (y: number) => number;
}

const HALF = Math.PI / 2;

/** An arc cut where it runs level, so that each piece lies on one side of its centre. */
function edgesOf(s: Segment): Edge[] {
  const edge = (from: number, to: number, xAt: Edge['xAt']): Edge => ({
    low: Math.min(from, to),
    high: Math.max(from, to),
    xAt,
  });
  if (s.kind === 'line') return [edge(s.a.y, s.b.y, (y) => s.a.x + ((y - s.a.y) / (s.b.y - s.a.y)) * (s.b.x - s.a.x))];
  const { centre, radius, start, sweep } = s;
  const [least, most] = [Math.min(start, start + sweep), Math.max(start, start + sweep)];
  const level: number[] = [];
  for (let k = Math.ceil((least - HALF) / Math.PI); HALF + k * Math.PI < most; k++)
    if (HALF + k * Math.PI > least) level.push(HALF + k * Math.PI);
  if (sweep < 0) level.reverse();
  const angles = [start, ...level, start + sweep];
  const ys = [s.a.y, ...level.map((angle) => centre.y + radius * Math.sin(angle)), s.b.y];
  return angles.slice(1).map((angle, i) => {
    const side = Math.cos((angles[i]! + angle) / 2) > 0 ? 1 : -1;
    return edge(
      ys[i]!,
      ys[i + 1]!,
      (y) => centre.x + side * Math.sqrt(Math.max(0, radius * radius - (y - centre.y) ** 2)),
    );
  });
}

/** Which parts of a level line lie inside closed contours, even–odd. */
export class InsideRows {
  private readonly edges: readonly Edge[];

  /** Throws for an open contour, which has no inside. */
  constructor(contours: readonly Contour[]) {
    if (contours.some((c) => !c.closed)) throw new RangeError('an open contour has no inside');
    this.edges = contours.flatMap((c) => segmentsOf(c).flatMap(edgesOf)).filter((e) => e.low < e.high);
  }

  /** X at which the level line at y goes in, out, in … of the contours; always an even count. */
  crossings(y: number): number[] {
    const xs: number[] = [];
    for (const e of this.edges) if (e.low <= y && y < e.high) xs.push(e.xAt(y));
    return xs.sort((a, b) => a - b);
  }
}
