import type { Dado, DadoEnd, LayoutPart } from '../particulars/particulars.ts';
import { SAME } from '../tolerances.ts';
import { openingLabel } from '../frame/opening-label.ts';
import type { Box, Sides } from './box.ts';
import { placePartitions } from './place-partitions.ts';
import { tidyLength } from './tidy-length.ts';

/** The frame that covers a box: its size, its members and the dados of all parts that plug in; frame view. */
export interface BoxLayout {
  readonly width: number;
  readonly height: number;
  readonly stiles: { readonly left: number; readonly right: number };
  readonly rails: { readonly top: number; readonly bottom: number };
  /** Width of the mid-stiles; 0 without partitions. */
  readonly between: number;
  /** Width of each opening, left to right. */
  readonly openings: readonly number[];
  readonly openingHeight: number;
  readonly layout: LayoutPart;
  readonly dados: readonly Dado[];
}

type Upright = Pick<Dado, 'from' | 'to' | 'ends'>;

/** Where an upright part's dado ends below and above when the part reaches past bottom and top. */
function runOut({ overhang, dado }: Box, height: number): Upright {
  const stops = (past: number): boolean => dado.run === 'stopped' && past > 0;
  const end = (past: number): DadoEnd => (stops(past) ? 'stopped' : 'open');
  return {
    from: stops(overhang.bottom) ? overhang.bottom : 0,
    to: stops(overhang.top) ? tidyLength(height - overhang.top) : height,
    ends: [end(overhang.bottom), end(overhang.top)],
  };
}

/** Openings side by side; their widths are fixed but for the last, unless all are alike. */
function layoutOf(openings: readonly number[], between: number): LayoutPart {
  const alike = openings.every((width) => Math.abs(width - openings[0]!) < SAME);
  const parts = openings.map((size, i): LayoutPart => {
    const opening = { label: openingLabel(i) };
    return alike || i === openings.length - 1 ? { opening } : { opening, size };
  });
  return parts.length === 1 ? parts[0]! : { columns: parts, between };
}

/** Width of each opening: from the members' edges, which lie past the parts by the reveal. */
function openingWidths(
  width: number,
  stiles: Pick<Sides, 'left' | 'right'>,
  centres: readonly number[],
  between: number,
): number[] {
  const starts = [stiles.left, ...centres.map((c) => c + between / 2)];
  const ends = [...centres.map((c) => c - between / 2), width - stiles.right];
  return starts.map((from, i) => tidyLength(ends[i]! - from));
}

/**
 * A box laid out behind its frame. The frame's size is the box's with the overhang; each outer member covers its part
 * and the reveal; mid-stiles stand centred before the partitions. Bottom and top meet the ends, partitions meet bottom
 * and top. Plain sums; a box that cannot be gives members or openings of no size: hold it against check-box.ts first.
 */
export function layOutBox(box: Box): BoxLayout {
  const { overhang, reveal, bottom, top, feet } = box;
  const end = box.ends.thickness;
  const width = tidyLength(box.width + overhang.left + overhang.right);
  const height = tidyLength(box.height + overhang.top + overhang.bottom);

  const stiles = {
    left: tidyLength(overhang.left + end + reveal.left),
    right: tidyLength(overhang.right + end + reveal.right),
  };
  const bottomAt = tidyLength(overhang.bottom + bottom.up);
  const bottomTop = tidyLength(bottomAt + bottom.thickness);
  const covered = top ? top.down + top.thickness : 0;
  const rails = {
    top: tidyLength(overhang.top + covered + reveal.top),
    bottom: tidyLength(bottomTop + reveal.bottom - feet),
  };

  const partition = box.partitions?.thickness ?? 0;
  const places = placePartitions(box).map((at) => tidyLength(overhang.left + at));
  const between = places.length > 0 ? tidyLength(partition + 2 * reveal.partition) : 0;
  const openings = openingWidths(
    width,
    stiles,
    places.map((at) => at + partition / 2),
    between,
  );

  const common = { clearance: box.dado.clearance, depth: box.dado.depth };
  const past = runOut(box, height);
  const leftFace = tidyLength(overhang.left + end);
  const rightEnd = tidyLength(width - overhang.right - end);
  const upright = (part: string, at: number, panel: number, run: Upright): Dado => ({
    part,
    runs: 'vertical',
    at,
    panel,
    ...common,
    ...run,
  });
  const level = (part: string, at: number, panel: number): Dado => ({
    part,
    runs: 'horizontal',
    at,
    panel,
    ...common,
    from: leftFace,
    to: rightEnd,
    ends: ['meets', 'meets'],
  });
  const topAt = top ? tidyLength(height - overhang.top - covered) : undefined;
  const standing: Upright = {
    from: bottomTop,
    to: topAt ?? past.to,
    ends: ['meets', topAt === undefined ? past.ends[1] : 'meets'],
  };
  const partitionName = (i: number): string => (places.length === 1 ? 'Partition' : `Partition ${i + 1}`);

  return {
    width,
    height,
    stiles,
    rails,
    between,
    openings,
    openingHeight: tidyLength(height - rails.top - rails.bottom - feet),
    layout: layoutOf(openings, between),
    dados: [
      upright('Left end', overhang.left, end, past),
      upright('Right end', rightEnd, end, past),
      ...places.map((at, i) => upright(partitionName(i), at, partition, standing)),
      level('Bottom', bottomAt, bottom.thickness),
      ...(top && topAt !== undefined ? [level(top.kind === 'panel' ? 'Top' : 'Stretcher', topAt, top.thickness)] : []),
    ],
  };
}
