import type { SheetColour } from '#shared/kernel/sheet/sheet-colours.ts';
import type { SheetModel } from '#shared/kernel/sheet/sheet-model.ts';
import { flowBlocks } from './flow-blocks.ts';
import { loadFonts } from './load-fonts.ts';
import { drawDraftMark, drawPageHead, drawTitleBlock, pageRoom } from './page-frame.ts';
import { addPage, closeDocument, openDocument, type Paper } from './pdf-document.ts';
import { placePage } from './place-page.ts';
import { printableDeep } from './printable-text.ts';

/**
 * A setup sheet as a PDF: four pages and as many more as its tables need, drawings to a stated standard scale.
 * The same model and paper give the same bytes. Throws RangeError when the model's date is none.
 */
export async function writeSetupSheet(model: SheetModel, paper: Paper): Promise<Uint8Array> {
  const { regular } = await loadFonts();
  const sheet = printableDeep(model, (code) => regular.some((f) => f.has.has(code)));
  const date = new Date(sheet.releasedAt);
  if (Number.isNaN(date.getTime())) throw new RangeError(`date of the sheet: got "${sheet.releasedAt}", takes an ISO date-time`);
  const block = sheet.titleBlock;
  const pen = await openDocument({
    title: `${block.identification}, ${sheet.draft ? 'draft' : `revision ${block.revision}`}`,
    subject: block.documentType,
    author: block.legalOwner,
    date,
    paper,
  });
  const room = pageRoom(paper);
  const colours: SheetColour[] = [];
  for (const page of sheet.pages) {
    const { blocks, gap } = placePage(page.blocks, room, page.colour);
    flowBlocks(pen, blocks, room, { colour: page.colour, gap }, (first) => {
      addPage(pen);
      colours.push(page.colour);
      drawPageHead(pen, paper, { ...page, title: first ? page.title : `${page.title}, continued` });
    });
  }
  colours.forEach((colour, i) => {
    pen.doc.switchToPage(i);
    drawTitleBlock(pen, paper, block, `${i + 1} of ${colours.length}`, colour);
    if (sheet.draft) drawDraftMark(pen, paper);
  });
  return closeDocument(pen);
}
