import { refused, type Drawn } from './entity-plane.ts';
import type { EntityTags } from './entity-tags.ts';
import type { NameTable } from './name-table.ts';
import { AS_DRAWN, placeWithin, turn, turnedOver, type Placement } from './placement.ts';

/** A block put somewhere once or in rows and columns. */
export interface Insert {
  readonly block: number;
  readonly columns: number;
  readonly rows: number;
  readonly lifted: boolean;
  /** Places the block's contents, its base point at 0, 0, for the first column and row. */
  readonly placement: Placement;
  /** Steps from one column, and from one row, to the next. */
  readonly column: readonly [x: number, y: number];
  readonly row: readonly [x: number, y: number];
}

/**
 * INSERT (DXF Reference, INSERT): the block is scaled (41, 42), turned (50, degrees) and moved to 10, 20, all in the
 * coordinates of its extrusion; rows and columns (70, 71) step by 44 and 45 along the turned axes, not scaled. A negative
 * scale mirrors.
 */
export function readInsert(tags: EntityTags, names: NameTable): Insert | Drawn {
  let block = -1;
  let x = NaN;
  let y = NaN;
  let z = 0;
  let scaleX = 1;
  let scaleY = 1;
  let angle = 0;
  let columns = 1;
  let rows = 1;
  let columnStep = 0;
  let rowStep = 0;
  for (let i = 0; i < tags.count; i++)
    switch (tags.codes[i]!) {
      case 2:
        block = names.idAt(tags.startOf(i), tags.endOf(i));
        break;
      case 10:
        x = tags.number(i);
        break;
      case 20:
        y = tags.number(i);
        break;
      case 30:
        z = tags.number(i);
        break;
      case 41:
        scaleX = tags.number(i);
        break;
      case 42:
        scaleY = tags.number(i);
        break;
      case 50:
        angle = tags.number(i);
        break;
      case 70:
        columns = tags.whole(i);
        break;
      case 71:
        rows = tags.whole(i);
        break;
      case 44:
        columnStep = tags.number(i);
        break;
      case 45:
        rowStep = tags.number(i);
        break;
    }
  tags.need(x, y);
  const face = tags.facing();
  if (tags.fault !== null) return refused(tags.fault.reason);
  if (scaleX === 0 || scaleY === 0) return refused('bad-size');
  if (face === 'tilted') return refused('tilted');
  const [cos, sin] = turn(angle);
  const own: Placement = { a: cos * scaleX, b: sin * scaleX, c: -sin * scaleY, d: cos * scaleY, e: x, f: y };
  const side = face === 'down' ? -1 : 1;
  return {
    block,
    // A count of 0 stands for none given.
    columns: Math.max(columns, 1),
    rows: Math.max(rows, 1),
    lifted: z !== 0,
    placement: face === 'down' ? placeWithin(turnedOver(AS_DRAWN), own) : own,
    column: [side * cos * columnStep, sin * columnStep],
    row: [side * -sin * rowStep, cos * rowStep],
  };
}
