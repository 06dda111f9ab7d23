import type { DrawingLayer } from '../drawing/drawing.ts';
import { formatLength } from '../units/format-length.ts';
import { UNIT_WORDS } from '../units/unit.ts';
import type { WorkedFrame } from '../worked-frame.ts';
import type { CutterGroup } from './cutter-groups.ts';
import { fileLine } from './file-lines.ts';
import { frontDrawing } from './front-drawing.ts';
import { lineSetTable } from './line-set-table.ts';
import { openingTable } from './place-tables.ts';
import type { SheetContext, SheetPage } from './sheet-model.ts';
import { sizeLines, stepsOnFront } from './steps-front.ts';

/** Page 3: the front, cut second. */
export function describeFront(
  worked: WorkedFrame,
  context: SheetContext,
  layers: ReadonlyMap<string, DrawingLayer>,
  groups: readonly CutterGroup[],
): SheetPage {
  const { unit } = worked.particulars;
  const { width, height } = worked.contours;
  return {
    id: 'front',
    colour: 'front',
    title: 'Front, cut second',
    lead: `Frame ${formatLength(width, unit)} × ${formatLength(height, unit)}, front face up, squared edges against the pins. All lengths in ${UNIT_WORDS[unit]}.`,
    blocks: [
      { kind: 'drawing', id: 'front-drawing', title: '', drawing: frontDrawing(worked, layers) },
      {
        kind: 'table',
        id: 'front-line-sets',
        title: 'Line sets, in cutting order',
        table: lineSetTable(worked, 'front', layers, groups),
        after: [fileLine(worked, 'front', context.profile)],
      },
      {
        kind: 'list',
        id: 'sizes',
        title: 'Which line, which size',
        ordered: false,
        items: sizeLines(worked, context.profile.openingLines),
      },
      {
        kind: 'table',
        id: 'openings',
        title: 'Openings, measured from the pins',
        table: openingTable(worked),
        after: [],
      },
      {
        kind: 'list',
        id: 'front-steps',
        title: 'On the front',
        ordered: true,
        beside: true,
        items: stepsOnFront(worked),
      },
    ],
  };
}
