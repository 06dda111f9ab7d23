import PDFDocument from 'pdfkit';
import { loadFonts } from './load-fonts.ts';
import type { Pen } from './pen.ts';

export type Paper = 'A4' | 'Letter';

/** Portrait, millimetres. ISO 216 and ANSI A. */
export const PAPER_SIZE: Record<Paper, { readonly width: number; readonly height: number }> = {
  A4: { width: 210, height: 297 },
  Letter: { width: 215.9, height: 279.4 },
};

/** PDF's unit is the point, 72 to the inch. */
export const POINTS_PER_MM = 72 / 25.4;

export interface DocumentFacts {
  readonly title: string;
  readonly subject: string;
  readonly author: string;
  /** The only date in the file, so that the same facts give the same bytes. */
  readonly date: Date;
  readonly paper: Paper;
}

/** An empty document whose pages are drawn on in millimetres. Its identifier follows from the facts, not from the clock. */
export async function openDocument({ title, subject, author, date, paper }: DocumentFacts): Promise<Pen> {
  const fonts = await loadFonts();
  const { width, height } = PAPER_SIZE[paper];
  const doc = new PDFDocument({
    size: [width * POINTS_PER_MM, height * POINTS_PER_MM],
    margin: 0,
    autoFirstPage: false,
    bufferPages: true,
    lang: 'en',
    displayTitle: true,
    info: {
      Title: title,
      Subject: subject,
      Author: author,
      Creator: 'Stilepost',
      Producer: 'Stilepost',
      CreationDate: date,
    },
  });
  for (const font of [...fonts.regular, ...fonts.bold]) doc.registerFont(font.name, Buffer.from(font.bytes));
  return { doc, fonts };
}

export function addPage({ doc }: Pen): void {
  doc.addPage();
  doc.scale(POINTS_PER_MM);
}

/** Ends the document and gives its bytes. */
export function closeDocument({ doc }: Pen): Promise<Uint8Array> {
  return new Promise((resolve, reject) => {
    const chunks: Buffer[] = [];
    doc.on('data', (chunk: Buffer) => chunks.push(chunk));
    doc.on('end', () => resolve(new Uint8Array(Buffer.concat(chunks))));
    doc.on('error', reject);
    doc.end();
  });
}
