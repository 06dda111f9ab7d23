import type { Particulars } from '../particulars/particulars.ts';
import { SAME, sheetLong, sheetShort } from '../tolerances.ts';
import type { Box } from './box.ts';
import type { BoxBounds } from './box-bounds.ts';
import { leastOpening } from './box-limits.ts';
import type { BoxLayout } from './lay-out-box.ts';
import { tidyLength } from './tidy-length.ts';

/** Openings that would be too small, said of the entry that makes them so. */
export function checkRoom(box: Box, layout: BoxLayout, bounds: BoxBounds): void {
  const least = leastOpening(box.unit);
  const short = (size: number): number => Math.max(0, least - size);
  const places = box.partitions?.places;
  if (places?.kind === 'given' && places.at.length > 0) {
    checkGivenPlaces(places.at, layout.openings, least, bounds);
  } else {
    const missing = layout.openings.reduce((sum, size) => sum + short(size), 0);
    bounds.least('width', box.width, tidyLength(box.width + missing), `each opening needs ${bounds.say(least)}`);
  }
  const height = tidyLength(box.height + short(layout.openingHeight));
  bounds.least('height', box.height, height, `the opening needs ${bounds.say(least)}`);
}

/** An opening is bounded by the partition on its right, the last one by the partition on its left. */
function checkGivenPlaces(at: readonly number[], openings: readonly number[], least: number, bounds: BoxBounds): void {
  const why = `the opening beside it needs ${bounds.say(least)}`;
  openings.forEach((size, i) => {
    if (size >= least - SAME) return;
    const last = i === openings.length - 1;
    const index = last ? i - 1 : i;
    const place = at[index]!;
    const field = `partitions.places.at.${index}`;
    if (last) bounds.most(field, place, tidyLength(place - (least - size)), why);
    else bounds.least(field, place, tidyLength(place + (least - size)), why);
  });
}

/** The frame's blank must come out of a sheet, its longer side along the sheet's. */
export function checkSheet(box: Box, { width, height }: BoxLayout, { setup }: Particulars, bounds: BoxBounds): void {
  const rim = 2 * (setup.allowance + setup.trim);
  const lies = width >= height;
  const most = lies
    ? { width: sheetLong(box.unit), height: sheetShort(box.unit) }
    : { width: sheetShort(box.unit), height: sheetLong(box.unit) };
  const why = 'the frame’s blank must come out of a sheet';
  bounds.most('width', box.width, tidyLength(most.width - rim - (width - box.width)), why);
  bounds.most('height', box.height, tidyLength(most.height - rim - (height - box.height)), why);
}
