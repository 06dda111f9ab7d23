import type { DrawingLayer } from '../drawing/drawing.ts';
import { formatLength } from '../units/format-length.ts';
import { UNIT_WORDS } from '../units/unit.ts';
import type { WorkedFrame } from '../worked-frame.ts';
import { backDrawing } from './back-drawing.ts';
import type { CutterGroup } from './cutter-groups.ts';
import { fileLine } from './file-lines.ts';
import { lineSetTable } from './line-set-table.ts';
import { dadoTable } from './place-tables.ts';
import type { SheetContext, SheetPage } from './sheet-model.ts';
import { stepsBeforeTurning } from './steps-back.ts';

/** Page 1: the back, cut first. */
export function describeBack(
  worked: WorkedFrame,
  context: SheetContext,
  layers: ReadonlyMap<string, DrawingLayer>,
  groups: readonly CutterGroup[],
): SheetPage {
  const { unit, thickness } = worked.particulars;
  const { rough } = worked.blank;
  const size = [rough.maxX, rough.maxY, thickness].map((v) => formatLength(v, unit)).join(' × ');
  return {
    id: 'back',
    colour: 'back',
    title: 'Back, cut first',
    lead: `Board ${size}, back face up, pins at the lower left. All lengths in ${UNIT_WORDS[unit]}.`,
    blocks: [
      { kind: 'drawing', id: 'back-drawing', title: '', drawing: backDrawing(worked, layers) },
      {
        kind: 'table',
        id: 'back-line-sets',
        title: 'Line sets, in cutting order',
        table: lineSetTable(worked, 'back', layers, groups),
        after: [fileLine(worked, 'back', context.profile)],
      },
      { kind: 'table', id: 'dados', title: 'Dados, measured from the pins', table: dadoTable(worked), after: [] },
      {
        kind: 'list',
        id: 'before-turning',
        title: 'Before the board is turned over',
        ordered: true,
        beside: true,
        items: stepsBeforeTurning(worked),
      },
      ...(context.note === ''
        ? []
        : [
            {
              kind: 'list',
              id: 'note',
              title: 'Note with this revision',
              ordered: false,
              items: [{ text: context.note }],
            } as const,
          ]),
    ],
  };
}
