import type { SheetColour } from '#shared/kernel/sheet/sheet-colours.ts';
import type { SheetBlock, SheetTitleBlock } from '#shared/kernel/sheet/sheet-model.ts';
import { flowBlocks } from './flow-blocks.ts';
import { loadFonts } from './load-fonts.ts';
import { drawDraftMark, drawPageHead, drawTitleBlock, pageRoom } from './page-frame.ts';
import { addPage, closeDocument, openDocument, type Paper } from './pdf-document.ts';
import { placePage } from './place-page.ts';
import { printableDeep } from './printable-text.ts';

export interface PrintedPage {
  readonly title: string;
  readonly lead: string;
  readonly colour: SheetColour;
  readonly blocks: readonly SheetBlock[];
}

export interface PrintedSheet {
  readonly titleBlock: SheetTitleBlock;
  /** ISO date-time; the only date in the file. */
  readonly releasedAt: string;
  /** True: marked 'draft, not for cutting' across every page. */
  readonly draft: boolean;
  readonly pages: readonly PrintedPage[];
}

const revisionWords = ({ draft, titleBlock: { revision } }: PrintedSheet): string[] =>
  draft ? ['draft'] : revision === '' ? [] : [`revision ${revision}`];

/** Pages with border, heading and title block as a PDF; each goes on to as many sheets as it needs. Throws RangeError when the date is none. */
export async function writePages(given: PrintedSheet, paper: Paper): Promise<Uint8Array> {
  const { regular } = await loadFonts();
  const sheet = printableDeep(given, (code) => regular.some((f) => f.has.has(code)));
  const date = new Date(sheet.releasedAt);
  if (Number.isNaN(date.getTime()))
    throw new RangeError(`date of the sheet: got "${sheet.releasedAt}", takes an ISO date-time`);
  const { titleBlock } = sheet;
  const pen = await openDocument({
    title: [titleBlock.identification, ...revisionWords(sheet)].join(', '),
    subject: titleBlock.documentType,
    author: titleBlock.legalOwner,
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
    drawTitleBlock(pen, paper, titleBlock, `${i + 1} of ${colours.length}`, colour);
    if (sheet.draft) drawDraftMark(pen, paper);
  });
  return closeDocument(pen);
}
