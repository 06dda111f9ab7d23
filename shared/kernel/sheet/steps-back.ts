import { radiusAtHeight } from '../cutters/radius-at-height.ts';
import { boardTolerance, SAME } from '../tolerances.ts';
import { formatWithUnit } from '../units/format-length.ts';
import type { WorkedFrame } from '../worked-frame.ts';
import { squaredOnBack } from './setup-items.ts';
import type { SheetLine } from './sheet-model.ts';

/** What comes free beyond the squared edges: the trim less the cutter's own width, which it turns to chips. */
function wasteWords(worked: WorkedFrame): string {
  const { unit, setup, thickness, cutters } = worked.particulars;
  const { rough } = worked.blank;
  const kerf = 2 * radiusAtHeight(cutters.squaring, thickness);
  const lines = squaredOnBack(worked.blank);
  const rims = [lines.minX - rough.minX, rough.maxX - lines.maxX, lines.minY - rough.minY, rough.maxY - lines.maxY];
  if (setup.squaring === 'all-edges')
    return Math.max(...rims) - kerf > SAME
      ? 'A rim comes free all round, so hold down the board itself, not its rim.'
      : 'Nothing comes free: the cutter takes the whole rim.';
  const strip = setup.trim - kerf;
  return strip > SAME
    ? `Strips ${formatWithUnit(strip, unit)} wide come free there: hold them down.`
    : 'Nothing comes free: the cutter takes the whole strip.';
}

/** What must be done on the back before the board is turned, in order. */
export function stepsBeforeTurning(worked: WorkedFrame): SheetLine[] {
  const { unit, thickness, setup, dados } = worked.particulars;
  const { rough, squaredEdges } = worked.blank;
  const length = (value: number) => formatWithUnit(value, unit);
  const squaring = worked.back.lineSets.find((s) => s.set === 'SQUARING');
  const depth = squaring ? ` Through, to ${length(squaring.depth)}.` : '';
  const all = setup.squaring === 'all-edges';
  const edges = all ? 'all four edges' : `the ${squaredEdges.join(' and ')} edges`;
  const free = wasteWords(worked);
  return [
    {
      word: 'Measure',
      text:
        `the board in several places. This sheet is worked for ${length(thickness)}. More than ${length(boardTolerance(unit))} away from that, ` +
        'stop and ask for a new revision. Width and height must be at least ' +
        `${length(rough.maxX)} × ${length(rough.maxY)}.`,
    },
    {
      word: 'Load',
      text: 'back face up, its lower left corner in the pins. Rough edges will do here.',
    },
    ...(dados.length > 0
      ? [
          {
            word: 'Cut the dados',
            text: 'first. Try an offcut of the box panel in one before going on; measure the depth.',
          },
        ]
      : []),
    {
      word: 'Square',
      text: `${edges} in the same clamping: do not loosen the board between dados and squaring.${depth} ${free}`,
    },
    {
      word: 'Mark',
      text: 'the squared corner with a pencil on this face, then loosen the board and go to the next sheet.',
    },
  ];
}
