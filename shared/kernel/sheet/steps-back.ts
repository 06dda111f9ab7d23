import { boardTolerance, SAME } from '../tolerances.ts';
import { formatWithUnit } from '../units/format-length.ts';
import type { WorkedFrame } from '../worked-frame.ts';
import type { SheetLine } from './sheet-model.ts';

/** What must be done on the back before the board is turned, in order. */
export function stepsBeforeTurning(worked: WorkedFrame): SheetLine[] {
  const { unit, thickness, setup, dados } = worked.particulars;
  const { rough, squaredEdges } = worked.blank;
  const length = (value: number) => formatWithUnit(value, unit);
  const squaring = worked.back.lineSets.find((s) => s.set === 'SQUARING');
  const depth = squaring ? ` Through, to ${length(squaring.depth)}.` : '';
  const all = setup.squaring === 'all-edges';
  const edges = all ? 'all four edges' : `the ${squaredEdges.join(' and ')} edges`;
  const free = all
    ? `A rim ${setup.trim > SAME ? `about ${length(setup.trim)} wide ` : ''}comes free all round, so hold the board itself down, not its rim.`
    : `Strips ${length(setup.trim)} wide come free there: hold them down.`;
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
      text: 'back face up, two neighbouring edges against the pins at the lower left. They may be rough: they are cut off or do not matter.',
    },
    ...(dados.length > 0
      ? [{ word: 'Cut the dados', text: 'first. Try an offcut of the box panel in one before going on; measure the depth.' }]
      : []),
    { word: 'Square', text: `${edges} in the same clamping: do not loosen the board between dados and squaring.${depth} ${free}` },
    { word: 'Mark', text: 'the squared corner with a pencil on this face, then loosen the board and go to the next sheet.' },
  ];
}
