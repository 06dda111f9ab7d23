import { openingCut } from '../line-sets/opening-cut.ts';
import { SAME } from '../tolerances.ts';
import { formatLength, formatWithUnit } from '../units/format-length.ts';
import type { WorkedFrame } from '../worked-frame.ts';

import type { SheetLine } from './sheet-model.ts';

const cutsOpenings = (worked: WorkedFrame) => worked.front.lineSets.some((s) => s.set === 'OPENING' && s.shapes.length > 0);

/** Where the entered size is true, and how far the cutter's axis runs inside it. None when no opening is cut. */
export function sizeLines(worked: WorkedFrame, openingLines: 'entered' | 'axis' | 'both'): SheetLine[] {
  if (!cutsOpenings(worked)) return [];
  const { unit, thickness } = worked.particulars;
  const cut = openingCut(worked.particulars);
  const length = (value: number) => formatWithUnit(value, unit);
  const at =
    cut.heldDepth === 0 ? 'at the face' : cut.heldDepth === thickness ? `at the back, ${length(thickness)} below the face` : `${length(cut.heldDepth)} below the face`;
  const narrowing = cut.atFace - cut.atBack;
  const taper = narrowing < SAME ? '' : ` At the back each opening is ${length(narrowing)} smaller a side than at the face.`;
  const offset = length(cut.axisOffset);
  const which = {
    both:
      `The opening layer is the entered size: run the cutter inside it, its axis ${offset} from the line. ` +
      'The axis layer says the same cut with that offset already in it: run the cutter on the line.',
    entered: `The opening layer is the entered size: run the cutter inside it, its axis ${offset} from the line.`,
    axis: `The axis layer has the offset of ${offset} already in it: run the cutter on the line, with no offset of your own.`,
  }[openingLines];
  return [
    { word: 'Entered size', text: `is true ${at} (z0 = ${formatLength(cut.heldDepth, unit)}).${taper}` },
    { word: openingLines === 'both' ? 'Cut one, not both.' : 'Opening line.', text: which },
  ];
}

/** What is done on the front, in order; the perimeter last. */
export function stepsOnFront(worked: WorkedFrame): SheetLine[] {
  const lifts = worked.front.lineSets.some((s) => s.set === 'CORNER_LIFT' && s.shapes.length > 0);
  return [
    { word: 'Check', text: 'that both edges against the pins are the squared ones and that no chips lie under the board.' },
    ...(cutsOpenings(worked) ? [{ word: 'Cut the openings', text: 'in passes, the last one through. Each offcut comes free: hold it down.' }] : []),
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
