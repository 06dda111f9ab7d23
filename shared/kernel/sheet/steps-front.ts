import { edgeOfOpening } from '../line-sets/held-depth.ts';
import type { LineSet, SetName } from '../line-sets/line-set.ts';
import { openingCut, type OpeningCut } from '../line-sets/opening-cut.ts';
import type { FileProfile } from '../profiles/file-profile.ts';
import { SAME } from '../tolerances.ts';
import { formatLength, formatWithUnit } from '../units/format-length.ts';
import type { WorkedFrame } from '../worked-frame.ts';

import type { SheetLine } from './sheet-model.ts';

/** Where an edge's entered size is true, and how far the cutter's axis runs inside it. `which` says which openings when there are several kinds. */
function sizeOf(
  worked: WorkedFrame,
  cut: OpeningCut,
  which: string,
  openingLines: FileProfile['openingLines'],
): SheetLine[] {
  const { unit, thickness } = worked.particulars;
  const length = (value: number) => formatWithUnit(value, unit);
  const at =
    cut.heldDepth === 0
      ? 'at the face'
      : cut.heldDepth === thickness
        ? `at the back, ${length(thickness)} below the face`
        : `${length(cut.heldDepth)} below the face`;
  const narrowing = cut.atFace - cut.atBack;
  const taper =
    narrowing < SAME ? '' : ` At the back each opening is ${length(narrowing)} smaller a side than at the face.`;
  const offset = length(cut.axisOffset);
  const lines = {
    both:
      `The opening layer is the entered size: run the cutter inside it, its axis ${offset} from the line. ` +
      'The axis layer says the same cut with that offset already in it: run the cutter on the line.',
    entered: `The opening layer is the entered size: run the cutter inside it, its axis ${offset} from the line.`,
    axis: `The axis layer has the offset of ${offset} already in it: run the cutter on the line, with no offset of your own.`,
  };
  return [
    { word: `Entered size${which}`, text: `is true ${at} (z0 = ${formatLength(cut.heldDepth, unit)}).${taper}` },
    {
      word: openingLines === 'both' ? `Cut one, not both${which}.` : `Opening line${which}.`,
      text: lines[openingLines],
    },
  ];
}

/** What each kind of opening's lines mean. None when no opening is cut. */
export function sizeLines(worked: WorkedFrame, openingLines: FileProfile['openingLines']): SheetLine[] {
  const sets = worked.front.lineSets.filter((s) => s.set === 'OPENING' && s.shapes.length > 0);
  const isSquare = (set: LineSet) => worked.contours.openings.some((o) => o.square && set.shapes[0]!.of.includes(o.id));
  return sets.flatMap((set) => {
    const { particulars } = worked;
    const square = isSquare(set);
    const cut = openingCut(particulars, edgeOfOpening(particulars.edge, { square }));
    return sizeOf(
      worked,
      cut,
      sets.length === 1 ? '' : square ? ' of square openings' : ' of beaded openings',
      openingLines,
    );
  });
}

/** What is done on the front, in the order of the line sets; the perimeter last. */
export function stepsOnFront(worked: WorkedFrame): SheetLine[] {
  const has = (...names: SetName[]) => worked.front.lineSets.some((s) => names.includes(s.set) && s.shapes.length > 0);
  const steps: (SheetLine | false)[] = [
    {
      word: 'Check',
      text: 'that both edges against the pins are the squared ones and that no chips lie under the board.',
    },
    has('BEAD_INNER', 'BEAD_OUTER', 'QUIRK', 'QUIRK_CORNER') && {
      word: 'Beads and quirks',
      text: 'before the openings, while the board is whole: each cutter on its line, at the depth of its line set.',
    },
    has('OPENING') && {
      word: 'Cut the openings',
      text: 'in passes, the last one through. Each offcut comes free: hold it down.',
    },
    has('CORNER_LIFT') && {
      word: 'Lift lines',
      text:
        'climb in space from full depth up into each corner of an opening; the tip follows the line, with no offset. ' +
        'Run them after the opening. They carry their own depths: do not flatten them.',
    },
    has('CORNER_VEE') && {
      word: 'V-cutter lines',
      text: 'run in space into the corners after that; the tip follows the line, with no offset and at its own depths.',
    },
    {
      word: 'Perimeter last,',
      text: 'outside, through. The frame is free from its rim then: hold it down before the last pass.',
    },
  ];
  return steps.filter((step) => step !== false);
}
