import { formatLength, formatWithUnit } from '../units/format-length.ts';
import type { WorkedFrame } from '../worked-frame.ts';
import { openingCut } from './opening-cut.ts';
import type { SheetLine } from './sheet-model.ts';

const cutsOffcuts = (worked: WorkedFrame) => worked.contours.openings.length > 0;

/** Where the entered size is true, and how far the cutter's axis runs inside it. */
export function sizeLines(worked: WorkedFrame, openingLines: 'entered' | 'axis' | 'both'): SheetLine[] {
  const cut = openingCut(worked);
  if (!cut) return [];
  const { unit, thickness } = worked.particulars;
  const at = cut.heldAt === 0 ? 'at the face' : cut.heldAt === thickness ? `at the back, ${formatWithUnit(thickness, unit)} below the face` : `${formatWithUnit(cut.heldAt, unit)} below the face`;
  const taper = cut.smallerAtBack === 0 ? '' : ` At the back each opening is ${formatWithUnit(cut.smallerAtBack, unit)} smaller a side than at the face.`;
  const entered = `with the cutter inside, its axis ${formatWithUnit(cut.axisOffset, unit)} from the line when the tip is at ${formatWithUnit(cut.tipDepth, unit)}`;
  const which = {
    both: `The opening layer is the entered size, cut ${entered}. The axis layer is the same cut with that offset already in it, cut on the line. Cut one, not both.`,
    entered: `The opening layer is the entered size: cut it ${entered}.`,
    axis: `The axis layer has the offset of ${formatWithUnit(cut.axisOffset, unit)} already in it: cut on the line, with no offset of your own.`,
  }[openingLines];
  return [
    { word: 'Entered size', text: `is true ${at} (z0 = ${formatLength(cut.heldAt, unit)}).${taper}` },
    { word: openingLines === 'both' ? 'Cut one, not both' : 'Opening line', text: which },
  ];
}

/** What is done on the front, in order; the perimeter last. */
export function stepsOnFront(worked: WorkedFrame): SheetLine[] {
  const lifts = worked.front.lineSets.some((s) => s.set === 'CORNER_LIFT' && s.shapes.length > 0);
  return [
    { word: 'Check', text: 'that both edges against the pins are the squared ones and that no chips lie under the board.' },
    ...(cutsOffcuts(worked) ? [{ word: 'Cut the openings', text: 'in passes, the last one through. Each offcut comes free: hold it down.' }] : []),
    ...(lifts
      ? [
          {
            word: 'Lift lines',
            text:
              'climb in space from full depth up into each corner of an opening; the tip follows the line, with no offset. ' +
              'Run them after the opening. They carry their own depths: do not flatten them.',
          },
        ]
      : []),
    { word: 'Perimeter last,', text: 'outside, through. The frame is free from its rim then: hold it down before the last pass.' },
  ];
}
