import type { Box } from './box.ts';
import { tidyLength } from './tidy-length.ts';

/** How many partitions a box has. */
export function countPartitions({ partitions }: Box): number {
  if (!partitions) return 0;
  return partitions.places.kind === 'given' ? partitions.places.at.length : partitions.places.count;
}

/** Left face of each partition, left to right, from the box's left outside; none without partitions. */
export function placePartitions(box: Box): number[] {
  const { partitions, ends, reveal } = box;
  if (!partitions) return [];
  const { places, thickness } = partitions;
  if (places.kind === 'given') return [...places.at];
  const { count } = places;
  // Equal spaces are equal openings of members that cover nothing but the parts.
  const past = places.kind === 'equal openings' ? reveal : { left: 0, right: 0, partition: 0 };
  const member = thickness + 2 * past.partition;
  const from = ends.thickness + past.left;
  const to = box.width - ends.thickness - past.right;
  const clear = (to - from - count * member) / (count + 1);
  return Array.from({ length: count }, (_, i) => tidyLength(from + (i + 1) * clear + i * member + past.partition));
}
