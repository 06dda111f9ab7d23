import { radiusAtHeight } from '../cutters/radius-at-height.ts';
import type { Particulars } from '../particulars/particulars.ts';
import { DEEPEST_DADO } from '../tolerances.ts';
import type { Box } from './box.ts';
import { boxBounds, type BoxBounds } from './box-bounds.ts';
import { leastRail, MOST_PARTITIONS, mostClearance } from './box-limits.ts';
import type { BoxProblem } from './box-problem.ts';
import { checkRoom, checkSheet } from './check-room.ts';
import { layOutBox } from './lay-out-box.ts';
import { countPartitions } from './place-partitions.ts';
import { tidyLength } from './tidy-length.ts';

function checkDados(box: Box, base: Particulars, bounds: BoxBounds): void {
  const { dado, ends, bottom, top, partitions } = box;
  const { say } = bounds;
  const deepest = tidyLength(base.thickness * DEEPEST_DADO);
  bounds.most('dado.clearance', dado.clearance, mostClearance(box.unit), 'more does not hold the panel');
  bounds.most('dado.depth', dado.depth, deepest, `two thirds of the frame’s ${say(base.thickness)}`);
  bounds.most('letIn', box.letIn, tidyLength(ends.thickness * DEEPEST_DADO), 'two thirds of the end');

  const cutter = 2 * radiusAtHeight(base.cutters.dado, base.thickness);
  const thick = (field: string, thickness: number): void =>
    bounds.least(
      field,
      thickness,
      tidyLength(cutter - dado.clearance),
      `its dado is cut with a cutter of ${say(cutter)}`,
    );
  thick('ends.thickness', ends.thickness);
  thick('bottom.thickness', bottom.thickness);
  if (top) thick('top.thickness', top.thickness);
  if (partitions && countPartitions(box) > 0) thick('partitions.thickness', partitions.thickness);
}

function checkOverhang({ unit, overhang, ends, bottom, top, feet, reveal }: Box, bounds: BoxBounds): void {
  const half = tidyLength(-ends.thickness / 2);
  const plugs = 'half of the end must plug into the frame';
  bounds.least('overhang.left', overhang.left, half, plugs);
  bounds.least('overhang.right', overhang.right, half, plugs);
  const behind = feet > 0 ? 'the bottom must lie above the feet' : 'the bottom must lie behind the frame';
  bounds.least('bottom.up', bottom.up, tidyLength(feet - overhang.bottom), behind);
  if (top) bounds.least('top.down', top.down, tidyLength(-overhang.top), 'the top must lie behind the frame');
  else
    bounds.least(
      'reveal.top',
      reveal.top,
      tidyLength(leastRail(unit) - overhang.top),
      'the top rail would be too narrow',
    );
}

/**
 * What cannot be of a box, entry by entry; none when its frame can be cut. `base` gives the board's thickness, the
 * cutters and the setup. Entries are held against one another here; that each is a length is the contract's work.
 */
export function checkBox(box: Box, base: Particulars): BoxProblem[] {
  const count = countPartitions(box);
  if (!(count >= 0 && count <= MOST_PARTITIONS))
    return [{ field: 'partitions.places', got: `${count} partitions`, takes: `at most ${MOST_PARTITIONS} partitions` }];
  const bounds = boxBounds(box.unit);
  checkDados(box, base, bounds);
  checkOverhang(box, bounds);
  // What follows is only worth saying of a box whose parts are right.
  if (bounds.problems.length > 0) return [...bounds.problems];
  const layout = layOutBox(box);
  checkRoom(box, layout, bounds);
  if (bounds.problems.length === 0) checkSheet(box, layout, base, bounds);
  return [...bounds.problems];
}
