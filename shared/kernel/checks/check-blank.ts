import type { FrameContours } from '../frame/members.ts';
import type { Particulars } from '../particulars/particulars.ts';
import type { BlankPlan } from '../placing/blank-plan.ts';
import { radiusAtHeight } from '../cutters/radius-at-height.ts';
import { allowanceSpare, SAME, sheetLong, sheetShort } from '../tolerances.ts';
import { formatWithUnit } from '../units/format-length.ts';
import type { Finding } from './finding.ts';
import { wholeFrame } from './place-finding.ts';

/** Frame against blank, blank against sheet, and room for the perimeter cutter. */
export function checkBlank(p: Particulars, contours: FrameContours, plan: BlankPlan): Finding[] {
  return [
    ...checkFrameOnBlank(p, contours, plan),
    ...checkSheet(p, contours, plan),
    ...checkAllowance(p, contours, plan),
  ];
}

/** What a given blank leaves beyond the frame on the sides away from the squared corner. */
function farAllowance(
  p: Particulars,
  { width, height }: FrameContours,
  { rough }: BlankPlan,
): { x: number; y: number } {
  const { allowance: k, trim: t, squaring } = p.setup;
  // All edges squared: the far sides are trimmed too, and need their trim.
  const trims = squaring === 'all-edges' ? 2 * t : t;
  return { x: rough.maxX - trims - k - width, y: rough.maxY - trims - k - height };
}

function checkFrameOnBlank(p: Particulars, contours: FrameContours, plan: BlankPlan): Finding[] {
  const far = farAllowance(p, contours, plan);
  const wanted = p.setup.squaring === 'all-edges' ? p.setup.allowance : 0;
  const short = { width: wanted - far.x, height: wanted - far.y };
  return (['width', 'height'] as const).flatMap((side): Finding[] => {
    const over = short[side];
    if (over <= SAME) return [];
    return [
      {
        code: 'frame-over-blank',
        level: 'stop',
        text: `The frame with its allowance and trim runs ${formatWithUnit(over, p.unit)} over the blank’s ${side}.`,
        remedy: 'Enter a larger blank, or leave it out: it then follows from the frame.',
        numbers: { over },
        places: [wholeFrame(contours)],
        field: `blank.${side}`,
      },
    ];
  });
}

function checkSheet(p: Particulars, contours: FrameContours, { rough }: BlankPlan): Finding[] {
  const short = Math.min(rough.maxX, rough.maxY);
  const long = Math.max(rough.maxX, rough.maxY);
  const sheet = { short: sheetShort(p.unit), long: sheetLong(p.unit) };
  if (short <= sheet.short + SAME && long <= sheet.long + SAME) return [];
  return [
    {
      code: 'blank-over-sheet',
      level: 'stop',
      text: `The blank of ${formatWithUnit(rough.maxX, p.unit)} × ${formatWithUnit(rough.maxY, p.unit)} does not fit on a sheet of ${formatWithUnit(sheet.short, p.unit)} × ${formatWithUnit(sheet.long, p.unit)}.`,
      remedy: 'Make the frame smaller, or lessen allowance and trim.',
      numbers: { short, long, sheetShort: sheet.short, sheetLong: sheet.long },
      places: [wholeFrame(contours)],
      field: p.blank ? 'blank' : 'outline',
    },
  ];
}

function checkAllowance(p: Particulars, contours: FrameContours, plan: BlankPlan): Finding[] {
  const { allowance } = p.setup;
  const diameter = 2 * radiusAtHeight(p.cutters.perimeter, p.thickness);
  const wanted = diameter + allowanceSpare(p.unit);
  const far = farAllowance(p, contours, plan);
  const least = Math.min(allowance, far.x, far.y);
  if (least >= wanted - SAME || far.x < -SAME || far.y < -SAME) return [];
  return [
    {
      code: 'small-allowance',
      level: 'caution',
      text: `Only ${formatWithUnit(least, p.unit)} of board beside the perimeter; its cutter and a safe rim need ${formatWithUnit(wanted, p.unit)}.`,
      remedy: 'Give more allowance, or see that the rim left over cannot come loose.',
      numbers: { allowance: least, wanted },
      places: [wholeFrame(contours, 'front')],
      field: least < allowance - SAME ? 'blank' : 'setup.allowance',
    },
  ];
}
