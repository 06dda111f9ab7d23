import { nameLayers } from '../profiles/name-layers.ts';
import type { WorkedFrame } from '../worked-frame.ts';
import { cutterGroups } from './cutter-groups.ts';
import { describeBack } from './describe-back.ts';
import { describeCutters } from './describe-cutters.ts';
import { describeFront } from './describe-front.ts';
import { describeSection } from './describe-section.ts';
import { describeTurn } from './describe-turn.ts';
import type { SheetContext, SheetModel } from './sheet-model.ts';
import { describeTitleBlock } from './title-block.ts';

/**
 * The setup sheet of a worked frame as plain data: four pages in the order they are used, five when edges are beaded. Pure; a frame with stops gets a
 * sheet too (as a draft), with the lines that it has. Throws LayerClash when the profile gives two line sets one layer
 * name, and RangeError when `releasedAt` is not a date.
 */
export function describeSheet(worked: WorkedFrame, context: SheetContext): SheetModel {
  const layers = nameLayers(worked, context.profile);
  const groups = cutterGroups(worked);
  return {
    unit: worked.particulars.unit,
    draft: context.revision === '',
    titleBlock: describeTitleBlock(worked.particulars, context),
    releasedAt: context.releasedAt,
    pages: [
      describeBack(worked, context, layers, groups),
      describeTurn(worked),
      describeFront(worked, context, layers, groups),
      ...describeSection(worked),
      describeCutters(worked, context, groups),
    ],
  };
}
