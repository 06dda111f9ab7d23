import type { Cutter } from '../cutters/cutter.ts';
import { radiusAtHeight } from '../cutters/radius-at-height.ts';
import { segmentsOf, type Segment } from '../contour/segments.ts';
import { axisBeside } from './axis-beside.ts';
import { climbDepth, type ClimbDepth } from './climb-depth.ts';
import { DistanceBand } from './distance-band.ts';
import type { FaceCut, LayerLines } from './face-cut.ts';
import { sampleY, firstColumn, endColumn, type Grid } from './grid.ts';
import { uncut, type HeightField } from './height-field.ts';
import { InsideRows } from './inside-rows.ts';
import { RadialDepth } from './radial-depth.ts';
import { sweepClimb } from './sweep-climb.ts';

/** Samples worked at a time, as rows: few enough for their distances to stay in the processor's cache, however wide the board. */
const BAND_SAMPLES = 32_768;

/** A layer made ready for sweeping. */
interface Sweep {
  readonly layer: LayerLines;
  readonly owner: number;
  readonly axes: readonly Segment[];
  readonly reach: number;
  readonly radial: RadialDepth;
  readonly leaves: ClimbDepth;
  /** For a pocket: its lines, and its inside. */
  readonly pocket: { readonly lines: readonly Segment[]; readonly inside: InsideRows } | null;
}

const reachOf = (cutter: Cutter, depth: number) => radiusAtHeight(cutter, depth);

function makeReady(layer: LayerLines, cell: number): Sweep {
  const { cutter, contours, side, beside, depth } = layer;
  return {
    layer,
    owner: layer.order + 1,
    axes: axisBeside(contours, side, beside),
    reach: reachOf(cutter, depth),
    radial: new RadialDepth(cutter),
    leaves: climbDepth(cutter, cell),
    pocket: layer.pocket ? { lines: contours.flatMap(segmentsOf), inside: new InsideRows(contours) } : null,
  };
}

/** Lowers a stretch of one row of a field to what the distances in a band leave. */
function cutStretch(
  field: HeightField,
  band: DistanceBand,
  row: number,
  from: number,
  to: number,
  { radial, owner, layer }: Sweep,
): void {
  const { depth, by, thickness, grid } = field;
  const { square } = band;
  const start = band.rowStart(row);
  const tip = layer.depth;
  for (let i = from; i < to; i++) {
    const away = square[start + i]!;
    if (away === Infinity) continue;
    const left = radial.at(away, tip);
    const d = left < thickness ? left : thickness;
    const at = row * grid.columns + i;
    if (d > depth[at]!) {
      depth[at] = d;
      by[at] = owner;
    }
  }
}

/** Lowers to full depth what lies inside a pocket's lines and at least the cutter's radius from them. */
function clearRow(
  field: HeightField,
  band: DistanceBand,
  row: number,
  inside: InsideRows,
  { owner, layer }: Sweep,
): void {
  const { depth, by, grid } = field;
  const floor = Math.min(layer.depth, field.thickness);
  const least = layer.beside ** 2;
  const offset = row * grid.columns - band.rowStart(row);
  const start = band.rowStart(row);
  const xs = inside.crossings(sampleY(grid, row));
  for (let c = 0; c + 1 < xs.length; c += 2) {
    const to = start + endColumn(grid, xs[c + 1]!);
    for (let k = start + firstColumn(grid, xs[c]!); k < to; k++) {
      const at = k + offset;
      if (band.square[k]! < least || depth[at]! >= floor) continue;
      depth[at] = floor;
      by[at] = owner;
    }
  }
}

function sweepBand(
  field: HeightField,
  bands: readonly [DistanceBand, DistanceBand],
  first: number,
  end: number,
  sweep: Sweep,
): void {
  const [axes, lines] = bands;
  axes.begin(first, end);
  for (const axis of sweep.axes) axes.spread(axis, sweep.reach);
  for (let row = first; row < end; row++)
    axes.eachTouched(row, (from, to) => cutStretch(field, axes, row, from, to, sweep));
  if (sweep.pocket) {
    lines.begin(first, end);
    for (const line of sweep.pocket.lines) lines.spread(line, sweep.layer.beside);
    for (let row = first; row < end; row++) clearRow(field, lines, row, sweep.pocket.inside, sweep);
  }
  for (const path of sweep.layer.climbs)
    sweepClimb(field, first, end, sweep.owner, sweep.layer.cutter, sweep.leaves, path);
}

/**
 * The height field of one face: every layer's cutter swept along its lines, the deepest cut kept. Along a flat line the
 * depth at a sample is exact: tip depth − h(distance), the distance to the nearest line or arc (arcs as arcs), in double
 * precision and then kept as a 32-bit number. `layers` says how many of the face's layers, in cutting order, are cut; all
 * when it is left out. Depth ends at the board's thickness.
 *
 * Yields the share done, from 0 to 1, after each band of rows, and returns the field: whoever runs it may stop in between.
 */
export function* sweepFace(
  cut: FaceCut,
  grid: Grid,
  layers: number = cut.layers.length,
): Generator<number, HeightField, void> {
  const field = uncut(grid, cut.thickness);
  const sweeps = cut.layers.slice(0, layers).map((layer) => makeReady(layer, grid.cell));
  const rows = Math.max(1, Math.floor(BAND_SAMPLES / grid.columns));
  const bands = [new DistanceBand(grid, rows), new DistanceBand(grid, rows)] as const;
  for (let first = 0; first < grid.rows; first += rows) {
    const end = Math.min(grid.rows, first + rows);
    for (const sweep of sweeps) sweepBand(field, bands, first, end, sweep);
    yield end / grid.rows;
  }
  return field;
}

/** Runs a generator of work to its end. */
export function runThrough<T>(work: Generator<number, T, void>): T {
  for (;;) {
    const step = work.next();
    if (step.done) return step.value;
  }
}
